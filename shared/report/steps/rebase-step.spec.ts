import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Report } from '../report';
import { proseBlock, sampleReport } from '../testing/sample-report';
import { documentToText } from '../text/document-to-text';
import type { TextDocument } from '../text/text-document';
import { applyStep } from './apply-step';
import { rebaseStep } from './rebase-step';
import type { EditText, Step } from './step';
import { embolden, insertText, replaceText } from './testing/text-steps';

const NOW = { at: '2026-03-01T10:00:00.000Z' };
const TEXT = 'Risk was higher with every level of wet work.';
const REPORT = sampleReport([proseBlock('b1', 'a0', TEXT), proseBlock('b2', 'a1', 'Other')]);

describe('rebaseStep', () => {
  it('maps typing over typing elsewhere in the block', () => {
    const theirs = insertText('b1', 1, 1, 'The ');
    const mine = replaceText('b1', 1, { from: 10, to: 16 }, 'lower');
    const rebased = rebaseStep(mine, [theirs]);
    expect(rebased).toMatchObject({ ok: true, value: { baseVersion: 2 } });
    expect(textAfter([theirs, rebased])).toBe('The Risk was lower with every level of wet work.');
  });

  it('maps several steps of one edit, each over the one before', () => {
    const theirs = insertText('b1', 1, 1, 'The ');
    const first = insertText('b1', 1, 46, ' Always').steps;
    const second = insertText('b1', 1, 53, ', too').steps;
    const mine: EditText = { ...insertText('b1', 1, 1, ''), steps: [...first, ...second] };
    expect(textAfter([theirs, rebaseStep(mine, [theirs])])).toBe(`The ${TEXT} Always, too`);
  });

  it('maps over several newer edits', () => {
    const theirs = [insertText('b1', 1, 1, 'The '), insertText('b1', 2, 5, 'crude ')];
    const mine = insertText('b1', 1, 46, ' Always.');
    const rebased = rebaseStep(mine, theirs);
    expect(rebased).toMatchObject({ ok: true, value: { baseVersion: 3 } });
    expect(textAfter([...theirs, rebased])).toBe(`The crude ${TEXT} Always.`);
  });

  it('leaves a step alone that nothing touched', () => {
    const mine = insertText('b1', 1, 1, 'x');
    expect(rebaseStep(mine, [insertText('b2', 1, 1, 'y')])).toEqual({ ok: true, value: mine });
    const older = insertText('b1', 0, 1, 'y');
    expect(rebaseStep(mine, [older])).toEqual({ ok: true, value: mine });
    const framing: Step = { kind: 'setFraming', framing: 'absolute' };
    expect(rebaseStep(framing, [mine])).toEqual({ ok: true, value: framing });
  });

  it.each<[string, Step, Step]>([
    [
      'both replace the same word',
      replaceText('b1', 1, { from: 10, to: 16 }, 'lower'),
      replaceText('b1', 1, { from: 10, to: 16 }, 'raised'),
    ],
    [
      'one deletes what the other changes inside',
      replaceText('b1', 1, { from: 12, to: 13 }, 'x'),
      replaceText('b1', 1, { from: 6, to: 22 }, ''),
    ],
    ['both type at one place', insertText('b1', 1, 5, 'a'), insertText('b1', 1, 5, 'b')],
    [
      'one sets bold what the other rewrites',
      embolden('b1', 1, { from: 8, to: 20 }),
      replaceText('b1', 1, { from: 10, to: 16 }, 'lower'),
    ],
    [
      'the content was replaced as a whole',
      insertText('b1', 1, 1, 'x'),
      { kind: 'replaceContent', blockId: 'b1', baseVersion: 1, content: {} },
    ],
    [
      'a whole replacement meets typing',
      { kind: 'replaceContent', blockId: 'b1', baseVersion: 1, content: {} },
      insertText('b1', 1, 1, 'x'),
    ],
  ])('gives both to a person when %s', (_name, mine, theirs) => {
    expect(rebaseStep(mine, [theirs])).toMatchObject({
      ok: false,
      issue: { code: 'staleEdit', facts: { blockId: 'b1', base: 1, present: 2 } },
    });
  });

  it('never loses a word of either side', () => {
    const edit = fc.record({ at: fc.integer({ min: 1, max: 46 }), long: fc.nat({ max: 3 }) });
    fc.assert(
      fc.property(edit, edit, (one, other) => {
        const theirs = typed(one, 'THEIRS');
        const rebased = rebaseStep(typed(other, 'MINE'), [theirs]);
        if (!rebased.ok) return;
        const text = textAfter([theirs, rebased]);
        expect(text).toContain('THEIRS');
        expect(text).toContain('MINE');
      }),
    );
  });
});

function typed({ at, long }: { at: number; long: number }, text: string): EditText {
  return replaceText('b1', 1, { from: at, to: Math.min(46, at + long) }, text);
}

function textAfter(steps: readonly (Step | ReturnType<typeof rebaseStep>)[]): string {
  const report = steps.reduce<Report>((present, one) => {
    const step = 'ok' in one ? unwrap(one) : one;
    const applied = applyStep(present, step, NOW);
    if (!applied.ok) throw new Error(applied.issue.code);
    return applied.value.report;
  }, REPORT);
  return documentToText((report.blocks[0]?.content as { document: TextDocument }).document);
}

function unwrap(result: ReturnType<typeof rebaseStep>): Step {
  if (!result.ok) throw new Error(result.issue.code);
  return result.value;
}
