import { BLOCK_ROWS, cellsOf, stridesOf, type CellCounter, type GridDigit } from './cell-grid';
import type { RowWeights } from './row-weights';

/** With more cells than this, only those that occur are kept. */
const MOST_DENSE_CELLS = 1 << 20;

/** Cell numbers beyond this are refused; a block keeps them as 32-bit numbers. */
export const MOST_CELLS = 2 ** 32;

/**
 * Counts rows that stand for any number of records, along digits of any size.
 *
 * Takes digits that make at most `MOST_CELLS` cells. Sums are exact as long as they stay within
 * 2^53, which the caller checks on the total.
 */
export function createNumberCounter(
  digits: readonly GridDigit[],
  weights: RowWeights,
): CellCounter {
  const cells = cellsOf(digits);
  const strides = stridesOf(digits);
  const sums = cells <= MOST_DENSE_CELLS ? denseSums(cells) : sparseSums();
  const numbers = new Uint32Array(BLOCK_ROWS);
  const records = new Float64Array(BLOCK_ROWS);

  function addBlock(from: number, to: number): void {
    numbers.fill(0);
    digits.forEach((digit, at) => {
      addDigit(digit, from, to, strides[at] ?? 1, numbers);
    });
    fillRecords(weights, from, to, records);
    sums.add(numbers, records, to - from);
  }

  return {
    add: (from, to) => {
      for (let at = from; at < to; at += BLOCK_ROWS) addBlock(at, Math.min(to, at + BLOCK_ROWS));
    },
    visit: sums.visit,
  };
}

interface Sums extends Pick<CellCounter, 'visit'> {
  readonly add: (numbers: Uint32Array, records: Float64Array, length: number) => void;
}

function denseSums(cells: number): Sums {
  const sums = new Float64Array(cells);
  return {
    add: (numbers, records, length) => {
      for (let at = 0; at < length; at += 1) {
        const cell = numbers[at] ?? 0;
        sums[cell] = (sums[cell] ?? 0) + (records[at] ?? 0);
      }
    },
    visit: (visit) => {
      sums.forEach((sum, cell) => {
        if (sum !== 0) visit(cell, sum);
      });
    },
  };
}

function sparseSums(): Sums {
  const sums = new Map<number, number>();
  return {
    add: (numbers, records, length) => {
      for (let at = 0; at < length; at += 1) {
        const cell = numbers[at] ?? 0;
        sums.set(cell, (sums.get(cell) ?? 0) + (records[at] ?? 0));
      }
    },
    visit: (visit) => {
      for (const [cell, sum] of sums) if (sum !== 0) visit(cell, sum);
    },
  };
}

function addDigit(
  { codes, map }: GridDigit,
  from: number,
  to: number,
  stride: number,
  numbers: Uint32Array,
): void {
  for (let row = from; row < to; row += 1) {
    const code = codes[row] ?? 0;
    const value = map === null ? code : (map[code] ?? 0);
    numbers[row - from] = (numbers[row - from] ?? 0) + value * stride;
  }
}

function fillRecords(
  { counts, minus }: RowWeights,
  from: number,
  to: number,
  records: Float64Array,
): void {
  if (counts === null) {
    records.fill(1, 0, to - from);
    return;
  }
  for (let row = from; row < to; row += 1) {
    const taken = minus === null ? 0 : (minus.numbers[minus.codes[row] ?? 0] ?? 0);
    records[row - from] = (counts.numbers[counts.codes[row] ?? 0] ?? 0) - taken;
  }
}
