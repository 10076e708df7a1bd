import type { Codes } from './encoded-cut';

/**
 * One digit of a cell's number. `size` is how many values it takes; `map` turns a code into its
 * value, null where the code is the value; digits without `codes` are the same for every row.
 */
export interface GridDigit {
  readonly size: number;
  readonly codes: Codes;
  readonly map: Uint32Array | null;
}

/** Calls `visit` with every cell that is not zero: its number, and the records in it. */
export type CellVisitor = (cell: number, count: number) => void;

/** Counts rows into cells; a cell's number is made of its digits, the last one fastest. */
export interface CellCounter {
  /** Counts the rows from `from` up to, without, `to`. */
  readonly add: (from: number, to: number) => void;
  readonly visit: (visit: CellVisitor) => void;
}

/** Rows that are worked on at a time, so that what they need stays in the processor's cache. */
export const BLOCK_ROWS = 8192;

/** The number that each digit of a cell is multiplied by. */
export function stridesOf(digits: readonly GridDigit[]): readonly number[] {
  const strides: number[] = [];
  let stride = 1;
  for (const { size } of digits.toReversed()) {
    strides.unshift(stride);
    stride *= size;
  }
  return strides;
}

/** How many cells digits make. */
export function cellsOf(digits: readonly GridDigit[]): number {
  return digits.reduce((cells, { size }) => cells * size, 1);
}
