import type { Block, Report } from '../report';
import { plainDocument } from '../text/text-document';

/** A block of prose with one paragraph. */
export function proseBlock(id: string, orderKey: string, text: string): Block {
  return {
    id,
    kind: 'prose',
    orderKey,
    content: { schemaVersion: 1, document: plainDocument(text) },
    version: 1,
    positionVersion: 1,
    removedAt: null,
  };
}

/** A report in drafting that holds these blocks. */
export function sampleReport(blocks: readonly Block[], changes: Partial<Report> = {}): Report {
  return {
    id: 'r1',
    studyId: 's1',
    title: 'Twelve-month results',
    framing: 'both',
    houseStyleId: 'open-clinical',
    stage: 'drafting',
    seq: 0,
    blocks,
    pins: {},
    ...changes,
  };
}
