import { it } from 'vitest';
import { bandColumn, setLayout, type CodeBook, type CodeBookColumn } from '#shared/code-book';
import { countTally, type EncodedColumn, type EncodedCut, type TallyRequest } from '#shared/tally';
import { report, type Timing, timingOf } from './measure';

const MILLION = 1_000_000;
const REQUEST: TallyRequest = { columnIds: ['outcome', 'exposure', 'stratum'], restrictions: [] };
const LEVELS = { outcome: 3, exposure: 7, stratum: 12 } as const;

it('counts a million records by three factors', () => {
  const cut = cutOf(MILLION);
  tell('count 1,000,000 records × 3 factors', cut, REQUEST, 1.3);
});

it('counts ten million records by three factors', () => {
  const cut = cutOf(10 * MILLION);
  tell('count 10,000,000 records × 3 factors', cut, REQUEST, 1.3);
});

it('counts ten million in proportion to one million', () => {
  const [million, ten] = [cutOf(MILLION), cutOf(10 * MILLION)];
  const [timing, floor] = inTurn(
    () => countTally(ten, BOOK, REQUEST),
    () => countTally(million, BOOK, REQUEST),
  );
  report({
    what: 'count 10,000,000 records, against 1,000,000 (at most 11 ×)',
    budgetInMilliseconds: Math.round(floor.median * 11),
    timing,
    floor: { what: 'a million', timing: floor },
  });
});

it('counts with a banded number, under restrictions, and by a count column', () => {
  const cut = cutOf(MILLION);
  const banded = { ...REQUEST, columnIds: ['outcome', 'exposure', 'age'] };
  tell('count 1,000,000 records with a banded number of 1,000 values', cut, banded, 4);
  const restrictions = [{ columnId: 'stratum', levelIds: ['1', '2'] }];
  const restricted = { columnIds: ['outcome', 'exposure'], restrictions };
  tell('count 1,000,000 records under a restriction', cut, restricted, 4);
  const counted = setLayout(BOOK, { kind: 'count', columnId: 'age' });
  tell('count 1,000,000 rows by a count column', cut, REQUEST, 6, counted);
});

function tell(
  what: string,
  cut: EncodedCut,
  request: TallyRequest,
  timesFloor: number,
  book: CodeBook = BOOK,
): void {
  const count = (): void => {
    const tally = countTally(cut, book, request);
    if (!tally.ok) throw new Error(tally.issue.code);
  };
  const [timing, floor] = inTurn(count, () => plainLoop(cut));
  report({
    what,
    budgetInMilliseconds: Math.round(floor.median * timesFloor * 10) / 10,
    timing,
    floor: { what: 'a plain loop with four accumulators', timing: floor },
  });
}

/** Times two works turn by turn, so that both meet the same busy machine. */
function inTurn(work: () => unknown, floor: () => unknown): readonly [Timing, Timing] {
  const times: [number[], number[]] = [[], []];
  for (let run = 0; run < WARM_UPS + RUNS; run += 1) {
    [work, floor].forEach((one, at) => {
      const start = performance.now();
      one();
      if (run >= WARM_UPS) times[at]!.push(performance.now() - start);
    });
  }
  return [timingOf(times[0]), timingOf(times[1])];
}

const RUNS = 41;
const WARM_UPS = 10;

/** Counts the codes as they are: no code book, no missing codes, nothing but the increments. */
function plainLoop(cut: EncodedCut): Uint32Array {
  const a = bytesOf(cut, 'outcome');
  const b = bytesOf(cut, 'exposure');
  const c = bytesOf(cut, 'stratum');
  const { exposure: across, stratum: deep } = LEVELS;
  const cells = LEVELS.outcome * across * deep;
  const [one, two] = [new Uint32Array(cells), new Uint32Array(cells)];
  const [three, four] = [new Uint32Array(cells), new Uint32Array(cells)];
  for (let at = 0; at + 3 < cut.rows; at += 4) {
    one[(a[at]! * across + b[at]!) * deep + c[at]!]! += 1;
    two[(a[at + 1]! * across + b[at + 1]!) * deep + c[at + 1]!]! += 1;
    three[(a[at + 2]! * across + b[at + 2]!) * deep + c[at + 2]!]! += 1;
    four[(a[at + 3]! * across + b[at + 3]!) * deep + c[at + 3]!]! += 1;
  }
  return one.map((count, cell) => count + two[cell]! + three[cell]! + four[cell]!);
}

function bytesOf(cut: EncodedCut, id: string): Uint8Array {
  return cut.columns.get(id)!.codes as Uint8Array;
}

/** Invented records; every column has a missing code. */
function cutOf(rows: number): EncodedCut {
  const random = pseudoRandom();
  const column = (values: number, codes: EncodedColumn['codes']): EncodedColumn => {
    for (let row = 0; row < rows; row += 1) codes[row] = Math.floor(random() * values);
    return { codes, dictionary: Array.from({ length: values }, (_, value) => String(value)) };
  };
  return {
    rows,
    decimalMark: '.',
    columns: new Map([
      ['outcome', column(LEVELS.outcome, new Uint8Array(rows))],
      ['exposure', column(LEVELS.exposure, new Uint8Array(rows))],
      ['stratum', column(LEVELS.stratum, new Uint8Array(rows))],
      ['age', column(1000, new Uint16Array(rows))],
    ]),
  };
}

function pseudoRandom(): () => number {
  let state = 1;
  return () => {
    state = (Math.imul(state, 1_103_515_245) + 12_345) & 0x7fffffff;
    return state / 0x80000000;
  };
}

const BOOK: CodeBook = {
  schemaVersion: 1,
  layout: { kind: 'records' },
  columns: [...Object.entries(LEVELS).map(([id, values]) => category(id, values)), age()],
};

function category(id: string, values: number): CodeBookColumn {
  const codes = Array.from({ length: values - 1 }, (_, value) => String(value));
  return {
    id,
    name: id,
    kind: 'category',
    label: id,
    sentenceLabel: id,
    unit: null,
    levels: codes.map((code) => ({ id: code, codes: [code], label: code, sentenceLabel: code })),
    bands: [],
    missingCodes: [{ code: String(values - 1), reason: 'Not answered' }],
    referenceLevelId: null,
  };
}

function age(): CodeBookColumn {
  const column: CodeBookColumn = { ...category('age', 1), kind: 'number', missingCodes: [] };
  const banded = bandColumn(column, [200, 400, 600, 800], 'wholeNumbers');
  return banded.ok ? banded.value : column;
}
