import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { BLOCK_KIND_LIST } from '../blocks/block-kinds';
import { placeAfter, visibleBlocks } from '../order';
import type { Block, Report } from '../report';
import { proseBlock, sampleReport } from '../testing/sample-report';
import { documentToText } from '../text/document-to-text';
import type { TextDocument } from '../text/text-document';
import { actionForStep, applyStep, isUndoBarrier, parseStep } from './apply-step';
import { insertText, replaceText } from './testing/text-steps';
import type { Step } from './step';
import { undoStep } from './undo-step';
import type { RecordedStep } from './undo-step';

const NOW = { at: '2026-03-01T10:00:00.000Z' };

const REPORT = sampleReport([
  proseBlock('b1', 'a0', 'One'),
  proseBlock('b2', 'a1', 'Two'),
  proseBlock('b3', 'a2', 'Three'),
]);

describe('applyStep', () => {
  it('inserts a block with its content as its kind reads it', () => {
    const content = { schemaVersion: 1, document: { type: 'doc', content: [] }, junk: 1 };
    const block = { id: 'b4', kind: 'prose', orderKey: 'a3', content };
    expect(applyStep(REPORT, { kind: 'insertBlock', block }, NOW)).toMatchObject({
      ok: false,
      issue: { code: 'textNotReadable', facts: { field: 'document' } },
    });
    const readable = { ...proseBlock('b4', 'a0V', 'Between'), junk: true };
    const after = apply(REPORT, { kind: 'insertBlock', block: readable });
    expect(visibleBlocks(after).map(({ id }) => id)).toEqual(['b1', 'b4', 'b2', 'b3']);
    expect(after.seq).toBe(1);
  });

  it('keeps a removed block as a tombstone that can come back', () => {
    const removed = apply(REPORT, { kind: 'removeBlock', blockId: 'b2' });
    expect(visibleBlocks(removed).map(({ id }) => id)).toEqual(['b1', 'b3']);
    expect(removed.blocks.find(({ id }) => id === 'b2')?.removedAt).toBe(NOW.at);
    const back = apply(removed, { kind: 'restoreBlock', blockId: 'b2' });
    expect(visibleBlocks(back)).toEqual(visibleBlocks(REPORT));
  });

  it('raises the content version by one and the position version by one', () => {
    const edited = apply(REPORT, insertText('b1', 1, 1, 'New '));
    expect(edited.blocks[0]).toMatchObject({ version: 2, positionVersion: 1 });
    const moved = apply(edited, {
      kind: 'moveBlock',
      blockId: 'b1',
      basePositionVersion: 1,
      orderKey: 'a3',
    });
    expect(moved.blocks[0]).toMatchObject({ version: 2, positionVersion: 2 });
  });

  it('sets a pin, moves it and takes it away', () => {
    const pinned = apply(REPORT, { kind: 'movePin', analysisId: 'x', resultId: 'r1' });
    const moved = apply(pinned, { kind: 'movePin', analysisId: 'x', resultId: 'r2' });
    expect([pinned.pins, moved.pins]).toEqual([{ x: 'r1' }, { x: 'r2' }]);
    expect(apply(moved, { kind: 'movePin', analysisId: 'x', resultId: null }).pins).toEqual({});
  });

  it('leaves the report it was given alone', () => {
    const before = structuredClone(REPORT);
    apply(REPORT, insertText('b1', 1, 1, 'x'));
    apply(REPORT, { kind: 'removeBlock', blockId: 'b1' });
    expect(REPORT).toEqual(before);
  });

  const content = proseBlock('b1', 'a0', 'New').content;

  it.each<[string, Step, Record<string, unknown>]>([
    [
      'a block that is there already',
      { kind: 'insertBlock', block: proseBlock('b1', 'a5', 'x') },
      { code: 'blockExists' },
    ],
    [
      'an unknown kind',
      { kind: 'insertBlock', block: { ...proseBlock('b9', 'a5', 'x'), kind: 'poem' } },
      { code: 'unknownBlockKind', facts: { kind: 'poem' } },
    ],
    [
      'a place that is no place',
      { kind: 'insertBlock', block: proseBlock('b9', '', 'x') },
      { code: 'orderKeyNotReadable' },
    ],
    ['a block that is not there', { kind: 'removeBlock', blockId: 'zz' }, { code: 'blockUnknown' }],
    [
      'a block that was not removed',
      { kind: 'restoreBlock', blockId: 'b1' },
      { code: 'blockNotRemoved' },
    ],
    [
      'an older content version',
      { kind: 'replaceContent', blockId: 'b1', baseVersion: 3, content },
      { code: 'staleEdit', facts: { blockId: 'b1', base: 3, present: 1 } },
    ],
    [
      'an older position',
      { kind: 'moveBlock', blockId: 'b1', basePositionVersion: 9, orderKey: 'a9' },
      { code: 'staleMove' },
    ],
    [
      'a text step outside the text',
      insertText('b1', 1, 900, 'x'),
      { code: 'textStepFailed', facts: { blockId: 'b1' } },
    ],
    [
      'a text step that is none',
      { kind: 'editText', blockId: 'b1', baseVersion: 1, steps: [{ stepType: 'explode' }, null] },
      { code: 'textStepFailed' },
    ],
    [
      'content of another kind',
      { kind: 'replaceContent', blockId: 'b1', baseVersion: 1, content: { level: 1 } },
      { code: 'contentNotReadable' },
    ],
  ])('refuses %s', (_name, step, issue) => {
    expect(applyStep(REPORT, step, NOW)).toMatchObject({ ok: false, issue });
  });

  it('refuses to change a removed block', () => {
    const removed = apply(REPORT, { kind: 'removeBlock', blockId: 'b1' });
    const step: Step = { kind: 'replaceContent', blockId: 'b1', baseVersion: 1, content };
    expect(applyStep(removed, step, NOW)).toMatchObject({ issue: { code: 'blockRemoved' } });
  });
});

describe('parseStep', () => {
  it('reads what it wrote', () => {
    const step = insertText('b1', 1, 1, 'x');
    expect(parseStep(JSON.parse(JSON.stringify(step)))).toEqual({ ok: true, value: step });
  });

  it.each([
    [null, { code: 'unknownStep' }],
    [{ kind: 'toString' }, { code: 'unknownStep' }],
    [{ kind: 'explode' }, { code: 'unknownStep', facts: { kind: 'explode' } }],
    [{ kind: 'removeBlock' }, { code: 'stepNotReadable', facts: { field: 'blockId' } }],
    [{ kind: 'setFraming', framing: 'loud' }, { code: 'stepNotReadable' }],
    [
      { kind: 'setTitle', title: '  ' },
      { code: 'stepNotReadable', facts: { field: 'title' } },
    ],
    [{ kind: 'editText', blockId: 'b', baseVersion: 0, steps: [1] }, { code: 'stepNotReadable' }],
  ])('refuses %j', (value, issue) => {
    expect(parseStep(value)).toMatchObject({ ok: false, issue });
  });
});

describe('actionForStep', () => {
  it('asks for the rights of the block’s kind', () => {
    for (const kind of BLOCK_KIND_LIST) {
      const block = { ...proseBlock('b9', 'a9', ''), kind: kind.id };
      const action = kind.rights === 'numbers' ? 'editNumbersBlocks' : 'editWordsBlocks';
      expect(actionForStep(REPORT, { kind: 'insertBlock', block })).toBe(action);
    }
  });

  it('asks for the rights of the report’s settings', () => {
    expect(actionForStep(REPORT, { kind: 'setFraming', framing: 'both' })).toBe('setFraming');
    expect(actionForStep(REPORT, { kind: 'setHouseStyle', houseStyleId: 'x' })).toBe(
      'editHouseStyle',
    );
  });
});

describe('undo', () => {
  it('stops at a pin', () => {
    expect(isUndoBarrier({ kind: 'movePin', analysisId: 'x', resultId: 'y' })).toBe(true);
    expect(isUndoBarrier({ kind: 'removeBlock', blockId: 'b1' })).toBe(false);
  });

  it('takes back any sequence of steps, to the same pages and settings', () => {
    fc.assert(
      fc.property(fc.array(UNDOABLE, { maxLength: 25 }), (changes) => {
        const { report, recorded } = applyAll(REPORT, changes);
        expect(shown(undoAll(report, recorded))).toEqual(shown(REPORT));
      }),
    );
  });

  it('takes back a pin by its inverse', () => {
    fc.assert(
      fc.property(ANY_PIN, (change) => {
        const start = { ...REPORT, pins: { x: 'r0' } };
        const step = change(start, 0);
        const applied = step === null ? null : applyStep(start, step, NOW);
        if (applied?.ok !== true) throw new Error('a pin can always be moved');
        expect(apply(applied.value.report, applied.value.inverse).pins).toEqual(start.pins);
      }),
    );
  });

  it('undoes a step under newer text elsewhere, and leaves that text alone', () => {
    const first = insertText('b1', 1, 1, 'Mine ');
    const second = insertText('b1', 2, 9, ' theirs');
    const { report, recorded } = applyAll(REPORT, [() => first, () => second]);
    const [mine, ...newer] = recorded;
    if (mine === undefined) throw new Error('nothing was recorded');
    const undo = undoStep(report, mine, newer);
    if (!undo.ok) throw new Error(undo.issue.code);
    expect(documentToText(documentOf(apply(report, undo.value), 'b1'))).toBe('One theirs');
  });

  it('undoes and redoes', () => {
    const { report, recorded } = applyAll(REPORT, [() => insertText('b1', 1, 1, 'x')]);
    const undone = undoAll(report, recorded);
    const [made] = recorded;
    const undo = made && undoStep(report, made, []);
    const applied = undo?.ok === true ? applyStep(report, undo.value, NOW) : undefined;
    if (undo?.ok !== true || applied?.ok !== true) throw new Error('could not undo');
    const { inverse } = applied.value;
    const redo = undoStep(undone, { id: 'u', undoes: '0', step: undo.value, inverse }, []);
    if (!redo.ok) throw new Error(redo.issue.code);
    expect(shown(apply(undone, redo.value))).toEqual(shown(report));
  });

  it('gives a changed place to a person', () => {
    const changes = [
      (): Step => replaceText('b1', 1, { from: 1, to: 4 }, 'Two'),
      (): Step => replaceText('b1', 2, { from: 2, to: 3 }, 'oo'),
    ];
    const { report, recorded } = applyAll(REPORT, changes);
    const [first, ...newer] = recorded;
    if (first === undefined) throw new Error('nothing was recorded');
    expect(undoStep(report, first, newer)).toMatchObject({ issue: { code: 'staleEdit' } });
  });

  it('reaches the same report when the steps travel as JSON', () => {
    fc.assert(
      fc.property(fc.array(ANY_CHANGE, { maxLength: 15 }), (changes) => {
        const { report, steps } = applyAll(REPORT, changes);
        const replayed = steps.reduce<Report>((present, step) => {
          const read = parseStep(JSON.parse(JSON.stringify(step)));
          return apply(present, read.ok ? read.value : step);
        }, REPORT);
        expect(replayed).toEqual(report);
      }),
    );
  });
});

describe('placeAfter', () => {
  it('puts a block where it was asked for, also between blocks that share a key', () => {
    fc.assert(
      fc.property(
        fc.array(fc.constantFrom('a0', 'a1', 'a2'), { minLength: 1, maxLength: 8 }),
        fc.nat(),
        (keys, seed) => {
          const report = sampleReport(
            keys.map((key, index) => proseBlock(`k${String(index)}`, key, '')),
          );
          const before = visibleBlocks(report).map(({ id }) => id);
          const at = seed % (before.length + 1);
          const { orderKey, rekeyed } = placeAfter(report, before[at - 1] ?? null);
          const blocks = [...report.blocks, proseBlock('new', orderKey, '')].map((block) => ({
            ...block,
            orderKey:
              rekeyed.find(({ blockId }) => blockId === block.id)?.orderKey ?? block.orderKey,
          }));
          const after = visibleBlocks({ blocks }).map(({ id }) => id);
          expect(after).toEqual(before.toSpliced(at, 0, 'new'));
        },
      ),
    );
  });
});

/** What a reader sees; tombstones, versions and the step number are not part of it. */
function shown(report: Report): unknown {
  const { title, framing, houseStyleId, pins } = report;
  const blocks = visibleBlocks(report).map(({ id, kind, content }) => ({ id, kind, content }));
  return { title, framing, houseStyleId, pins, blocks };
}

function apply(report: Report, step: Step): Report {
  const applied = applyStep(report, step, NOW);
  if (!applied.ok) throw new Error(`${step.kind}: ${applied.issue.code}`);
  return applied.value.report;
}

function documentOf(report: Report, blockId: string): TextDocument {
  const block = report.blocks.find(({ id }) => id === blockId);
  return (block?.content as { document: TextDocument }).document;
}

type Change = (report: Report, count: number) => Step | null;

interface Applied {
  readonly report: Report;
  readonly steps: readonly Step[];
  readonly recorded: readonly RecordedStep[];
}

/** Undoes step after step, each as a new step against the report as it then stands. */
function undoAll(report: Report, recorded: readonly RecordedStep[]): Report {
  const history = [...recorded];
  return recorded.reduceRight<Report>((present, undone, index) => {
    const step = undoStep(present, undone, history.slice(index + 1));
    if (!step.ok) throw new Error(step.issue.code);
    const applied = applyStep(present, step.value, NOW);
    if (!applied.ok) throw new Error(applied.issue.code);
    const { inverse } = applied.value;
    history.push({ id: `undo ${undone.id}`, undoes: undone.id, step: step.value, inverse });
    return applied.value.report;
  }, report);
}

function applyAll(start: Report, changes: readonly Change[]): Applied {
  return changes.reduce<Applied>(
    (done, change, count) => {
      const step = change(done.report, count);
      if (step === null) return done;
      const applied = applyStep(done.report, step, NOW);
      if (!applied.ok) throw new Error(`${step.kind}: ${applied.issue.code}`);
      return {
        report: applied.value.report,
        steps: [...done.steps, step],
        recorded: [
          ...done.recorded,
          { id: String(count), undoes: null, step, inverse: applied.value.inverse },
        ],
      };
    },
    { report: start, steps: [], recorded: [] },
  );
}

const WORD = fc.stringMatching(/^[a-z]{1,6}$/u);

const ANY_PIN: fc.Arbitrary<Change> = fc
  .tuple(WORD, fc.option(WORD))
  .map(([analysisId, resultId]): Change => () => ({ kind: 'movePin', analysisId, resultId }));

const UNDOABLE: fc.Arbitrary<Change> = fc.oneof(
  fc.tuple(fc.nat(), WORD).map(([at, text]): Change => (report, count) => {
    const visible = visibleBlocks(report);
    const after = visible[at % (visible.length + 1)]?.id ?? null;
    const { orderKey } = placeAfter(report, after);
    return { kind: 'insertBlock', block: proseBlock(`n${String(count)}`, orderKey, text) };
  }),
  onBlock((block) => ({ kind: 'removeBlock', blockId: block.id })),
  fc.nat().map((at): Change => (report) => {
    const removed = report.blocks.filter(({ removedAt }) => removedAt !== null);
    const block = removed[at % Math.max(1, removed.length)];
    return block === undefined ? null : { kind: 'restoreBlock', blockId: block.id };
  }),
  fc.tuple(fc.nat(), fc.nat()).map(([which, where]): Change => (report) => {
    const visible = visibleBlocks(report);
    const block = visible[which % Math.max(1, visible.length)];
    if (block === undefined) return null;
    const after = visible[where % visible.length]?.id ?? null;
    const { orderKey } = placeAfter(report, after, block.id);
    return {
      kind: 'moveBlock',
      blockId: block.id,
      basePositionVersion: block.positionVersion,
      orderKey,
    };
  }),
  WORD.chain((text) =>
    onBlock((block) => ({
      kind: 'replaceContent',
      blockId: block.id,
      baseVersion: block.version,
      content: proseBlock('x', 'a0', text).content,
    })),
  ),
  WORD.chain((text) => onBlock((block) => insertText(block.id, block.version, 1, text))),
  fc
    .constantFrom('absolute', 'both', 'relative')
    .map((framing): Change => () => ({ kind: 'setFraming', framing: framing as 'both' })),
  WORD.map((title): Change => () => ({ kind: 'setTitle', title })),
  WORD.map((houseStyleId): Change => () => ({ kind: 'setHouseStyle', houseStyleId })),
);

const ANY_CHANGE = fc.oneof({ arbitrary: UNDOABLE, weight: 9 }, { arbitrary: ANY_PIN, weight: 1 });

function onBlock(make: (block: Block) => Step): fc.Arbitrary<Change> {
  return fc.nat().map((at): Change => (report) => {
    const visible = visibleBlocks(report);
    const block = visible[at % Math.max(1, visible.length)];
    return block === undefined ? null : make(block);
  });
}
