import type { Block, Report, Step } from '#shared/report';
import { plainDocument, type TextDocument } from '#shared/report/text';
import type { MadeStep, TakenStep } from '../made-step';

/** Prose of one paragraph. */
export function prose(id: string, text: string, place = 'a0'): Block {
  const content = { schemaVersion: 1, document: plainDocument(text) };
  return {
    id,
    kind: 'prose',
    orderKey: place,
    content,
    version: 1,
    positionVersion: 1,
    removedAt: null,
  };
}

/** A report that holds these blocks. */
export function reportOf(...blocks: Block[]): Report {
  return {
    id: 'report-1',
    studyId: 'study-1',
    title: 'Twelve-month results',
    framing: 'both',
    houseStyleId: 'open-clinical',
    stage: 'drafting',
    seq: 10,
    blocks,
    pins: {},
  };
}

/** Types text into the only paragraph of a block, `at` characters from its start. */
export function typing(blockId: string, baseVersion: number, at: number, text: string): Step {
  const steps = [
    {
      stepType: 'replace',
      from: at + 1,
      to: at + 1,
      slice: { content: [{ type: 'text', text }] },
    },
  ];
  return { kind: 'editText', blockId, baseVersion, steps };
}

/** Takes text out of the only paragraph of a block. */
export function deleting(blockId: string, baseVersion: number, from: number, to: number): Step {
  const steps = [{ stepType: 'replace', from: from + 1, to: to + 1 }];
  return { kind: 'editText', blockId, baseVersion, steps };
}

/** Puts another text into a block as a whole. */
export function rewriting(blockId: string, baseVersion: number, text: string): Step {
  const content = { schemaVersion: 1, document: plainDocument(text) };
  return { kind: 'replaceContent', blockId, baseVersion, content };
}

/** A step made here. */
export function made(id: string, step: Step, groupId = `group-${id}`): MadeStep {
  return { id, groupId, undoes: null, step };
}

/** A step that the server took from somebody. */
export function taken(seq: number, id: string, step: Step, person = 'Ines Okafor'): TakenStep {
  return { ...made(id, step), seq, person, at: '2025-12-01T10:00:00.000Z' };
}

/** The words of a block. */
export function wordsOf(report: Report, blockId: string): string {
  const block = report.blocks.find((each) => each.id === blockId);
  const { document } = block?.content as { document: TextDocument };
  const [paragraph] = document.content;
  const inline = paragraph?.type === 'paragraph' ? (paragraph.content ?? []) : [];
  return inline.map((node) => (node.type === 'text' ? node.text : '')).join('');
}
