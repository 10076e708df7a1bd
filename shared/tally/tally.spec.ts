import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  COUNTED_OUTCOME_COLUMN_ID,
  setLayout,
  type CodeBook,
  type CodeBookColumn,
  type CountLayout,
} from '#shared/code-book';
import type { EncodedCut } from './encoded-cut';
import type { Tally, TallyRequest } from './tally';
import { countTally, createTallyCounter } from './tally-counter';
import { tallyIssueMessage } from './tally-issue';
import { encodeCut } from './testing/encode';
import { naiveTally } from './testing/naive-tally';

const VALUES = ['a', 'b', 'c', 'd', '', 'NA', '9'];

const category = (id: string): CodeBookColumn => ({
  id,
  name: id,
  kind: 'category',
  label: id.toUpperCase(),
  sentenceLabel: id,
  unit: null,
  levels: [
    { id: 'bc', codes: ['b', 'c'], label: 'BC', sentenceLabel: 'bc' },
    { id: 'a', codes: ['a'], label: 'A', sentenceLabel: 'a' },
    { id: 'idle', codes: ['nowhere'], label: 'Idle', sentenceLabel: 'idle' },
  ],
  bands: [],
  missingCodes: [
    { code: 'NA', reason: 'Not available' },
    { code: '9', reason: 'Not available' },
  ],
  referenceLevelId: null,
});

const measured: CodeBookColumn = {
  ...category('z'),
  kind: 'number',
  levels: [],
  bands: [
    { id: 'high', lower: 300, upper: 900, label: 'h', sentenceLabel: 'h' },
    { id: 'low', lower: null, upper: 100, label: 'l', sentenceLabel: 'l' },
  ],
};

const count = (id: string): CodeBookColumn => ({ ...category(id), kind: 'count', levels: [] });

const records: CodeBook = {
  schemaVersion: 1,
  layout: { kind: 'records' },
  columns: [category('w'), category('x'), category('y'), measured, count('n'), count('m')],
};

const LAYOUTS: readonly CountLayout[] = [
  { kind: 'records' },
  { kind: 'count', columnId: 'n' },
  { kind: 'eventsAndTotal', eventsColumnId: 'n', totalColumnId: 'm' },
  { kind: 'casesAndControls', casesColumnId: 'm', controlsColumnId: 'n' },
];

/** `m` is never below `n`, so that they may be events and total. */
const cuts = fc
  .array(
    fc.record({
      w: fc.constantFrom(...VALUES),
      x: fc.constantFrom(...VALUES),
      y: fc.constantFrom(...VALUES),
      z: fc.oneof(
        fc.integer({ min: -50, max: 1200 }).map(String),
        fc.constantFrom('', 'NA', 'many'),
      ),
      n: fc.integer({ min: 0, max: 5 }),
      more: fc.integer({ min: 0, max: 1e6 }),
    }),
    { maxLength: 400 },
  )
  .map((rows) =>
    encodeCut({
      w: rows.map(({ w }) => w),
      x: rows.map(({ x }) => x),
      y: rows.map(({ y }) => y),
      z: rows.map(({ z }) => z),
      n: rows.map(({ n }) => String(n)),
      m: rows.map(({ n, more }) => String(n + more)),
    }),
  );

const LEVELS: Readonly<Record<string, readonly string[]>> = {
  w: ['bc', 'a', 'idle'],
  x: ['bc', 'a', 'idle'],
  z: ['high', 'low'],
  [COUNTED_OUTCOME_COLUMN_ID]: ['event', 'non-event'],
};

const requests = (layout: CountLayout) => {
  const outcome = layout.kind.includes('And') ? [COUNTED_OUTCOME_COLUMN_ID] : [];
  return fc.record({
    columnIds: fc.shuffledSubarray(['w', 'x', 'y', 'z', ...outcome], { minLength: 1 }),
    restrictions: fc.array(
      fc
        .constantFrom('w', 'x', 'z', ...outcome)
        .chain((columnId) =>
          fc
            .subarray([...(LEVELS[columnId] ?? [])], { minLength: 1 })
            .map((levelIds) => ({ columnId, levelIds })),
        ),
      { maxLength: 3 },
    ),
  });
};

describe('countTally', () => {
  it.each(LAYOUTS)('agrees with counting record by record: $kind', (layout) => {
    const codeBook = setLayout(records, layout);
    fc.assert(
      fc.property(cuts, requests(layout), (cut, request) => {
        expect(inOrder(counted(cut, codeBook, request))).toEqual(
          inOrder(naiveTally(cut, codeBook, request)),
        );
      }),
      { numRuns: 300 },
    );
  });

  it('accounts for every record', () => {
    fc.assert(
      fc.property(cuts, requests({ kind: 'records' }), (cut, request) => {
        const tally = counted(cut, records, request);
        const leftOut = tally.leftOut.reduce((sum, part) => sum + part.count, 0);
        expect(tally.counted + tally.restricted + leftOut).toBe(cut.rows);
      }),
    );
  });

  it('counts range by range what it counts at once', () => {
    fc.assert(
      fc.property(
        cuts,
        requests({ kind: 'records' }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (cut, request, share) => {
          const counter = createTallyCounter(cut, records, request);
          if (!counter.ok) throw new Error(counter.issue.code);
          const middle = Math.floor(cut.rows * share);
          counter.value.add(0, middle);
          counter.value.add(middle, cut.rows);
          expect(counter.value.finish()).toEqual(countTally(cut, records, request));
        },
      ),
    );
  });

  it.each([8191, 8192, 8193, 20_002])('counts %d rows, over the borders of its blocks', (rows) => {
    const cells = Array.from({ length: rows }, (_, row) => VALUES[(row * 7) % 5] ?? '');
    const wide = Array.from({ length: rows }, (_, row) => String(row % 1000));
    const cut = encodeCut({ w: cells, x: [...cells].reverse(), z: wide });
    const request = { columnIds: ['w', 'z', 'x'], restrictions: [] };
    expect(inOrder(counted(cut, records, request))).toEqual(
      inOrder(naiveTally(cut, records, request)),
    );
  });

  it('orders the axes as the code book does, and the cells by axis', () => {
    const tally = counted(encodeCut({ w: ['a', 'b', 'a'] }), records, {
      columnIds: ['w'],
      restrictions: [],
    });
    expect(tally).toEqual({
      axes: [{ columnId: 'w', levelIds: ['bc', 'a', 'idle'] }],
      cells: [
        { at: [0], count: 1 },
        { at: [1], count: 2 },
      ],
      counted: 3,
      restricted: 0,
      leftOut: [],
    });
  });

  it('counts many levels, more than fit side by side', () => {
    const many = Array.from({ length: 700 }, (_, level) => `v${String(level)}`);
    const levels = many.map((code) => ({
      id: code,
      codes: [code],
      label: code,
      sentenceLabel: code,
    }));
    const columns = ['w', 'x', 'y'].map((id) => ({ ...category(id), levels }));
    const cells = Array.from({ length: 2100 }, (_, row) => many[row % 700] ?? '');
    const cut = encodeCut({ w: cells, x: cells, y: [...cells].reverse() });
    const request = { columnIds: ['w', 'x', 'y'], restrictions: [] };
    const book = { ...records, columns };
    expect(inOrder(counted(cut, book, request))).toEqual(inOrder(naiveTally(cut, book, request)));
  });
});

describe('countTally refuses', () => {
  const cut = encodeCut({ w: ['a', 'b'], n: ['1', '2'], m: ['1', '1'] });
  const events: CountLayout = { kind: 'eventsAndTotal', eventsColumnId: 'n', totalColumnId: 'm' };

  it.each<[string, EncodedCut, CountLayout, Partial<TallyRequest>, object]>([
    ['unknownColumn', cut, { kind: 'records' }, { columnIds: ['gone'] }, { column: 'gone' }],
    ['columnTwice', cut, { kind: 'records' }, { columnIds: ['w', 'w'] }, { column: 'W' }],
    ['columnNotInData', cut, { kind: 'records' }, { columnIds: ['x'] }, { column: 'X' }],
    ['columnIsNoFactor', cut, { kind: 'records' }, { columnIds: ['n'] }, { column: 'N' }],
    [
      'unknownLevel',
      cut,
      { kind: 'records' },
      { restrictions: [{ columnId: 'w', levelIds: ['gone'] }] },
      { column: 'W', level: 'gone' },
    ],
    [
      'columnNotInData',
      encodeCut({ w: ['a'] }),
      { kind: 'count', columnId: 'n' },
      {},
      { column: 'N' },
    ],
    [
      'countNotUsable',
      encodeCut({ w: ['a', 'b'], n: ['1', '1.5'] }),
      { kind: 'count', columnId: 'n' },
      {},
      { column: 'N', row: 2, value: '1.5' },
    ],
    ['eventsExceedTotal', cut, events, {}, { row: 2, events: 2, total: 1 }],
    [
      'countsTooLarge',
      encodeCut({ w: ['a', 'b'], n: ['9007199254740991', '1'] }),
      { kind: 'count', columnId: 'n' },
      {},
      {},
    ],
  ])('%s', (code, data, layout, request, facts) => {
    const outcome = countTally(data, setLayout(records, layout), {
      columnIds: ['w'],
      restrictions: [],
      ...request,
    });
    if (outcome.ok) throw new Error('counted');
    expect(outcome.issue.code).toBe(code);
    expect(outcome.issue.facts ?? {}).toEqual(facts);
    expect(tallyIssueMessage(outcome.issue)).toMatch(/^[A-Z"].+\.$/);
  });

  it('more combinations than can be kept', () => {
    const levels = Array.from({ length: 2000 }, (_, at) => ({
      id: `l${String(at)}`,
      codes: [String(at)],
      label: 'l',
      sentenceLabel: 'l',
    }));
    const columns = ['w', 'x', 'y'].map((id) => ({ ...category(id), levels }));
    const cells = levels.map(({ codes }) => codes[0] ?? '');
    const outcome = countTally(
      encodeCut({ w: cells, x: cells, y: cells }),
      { ...records, columns },
      { columnIds: ['w', 'x', 'y'], restrictions: [] },
    );
    expect(outcome).toMatchObject({ ok: false, issue: { code: 'tooManyCells' } });
  });
});

function counted(cut: EncodedCut, codeBook: CodeBook, request: TallyRequest): Tally {
  const outcome = countTally(cut, codeBook, request);
  if (!outcome.ok) throw new Error(tallyIssueMessage(outcome.issue));
  return outcome.value;
}

/** Cells and reasons in one fixed order, since counting record by record has another. */
function inOrder(tally: Tally): Tally {
  const byText = (one: object, other: object): number =>
    JSON.stringify(one) < JSON.stringify(other) ? -1 : 1;
  return {
    ...tally,
    cells: [...tally.cells].sort(byText),
    leftOut: [...tally.leftOut].sort(byText),
  };
}
