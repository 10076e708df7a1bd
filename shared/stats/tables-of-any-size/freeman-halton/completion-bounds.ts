import type { LogFactorials } from './log-factorials';

/** The least and the most that the remaining cells' log factorials can sum to, in units. */
export interface CompletionBounds {
  readonly least: number;
  readonly most: number;
}

/**
 * Bounds on the sum of log factorials over every way to fill some columns under row totals.
 *
 * The least: each cell by itself, under multipliers that make independence the balance point (the
 * mode of a Poisson count), so that no search is needed. The most: each column filled row by row
 * from the largest, and each row column by column, whichever is less. Neither need be reached.
 */
export function completionBounds(
  rows: readonly number[],
  columns: readonly number[],
  logs: LogFactorials,
): CompletionBounds {
  if (columns.length === 1) {
    const only = rows.reduce((sum, total) => sum + (logs.units[total] as number), 0);
    return { least: only, most: only };
  }
  const most = Math.min(mostFilled(rows, columns, logs), mostFilled(columns, rows, logs));
  return { least: leastFilled(rows, columns, logs), most: most + logs.rounding };
}

function leastFilled(
  rows: readonly number[],
  columns: readonly number[],
  { logs, scale, rounding }: LogFactorials,
): number {
  const total = columns.reduce((sum, column) => sum + column, 0);
  let least = entropy(rows) + entropy(columns) - entropy([total]);
  for (const row of rows) {
    for (const column of columns) {
      const expected = (row / total) * column;
      const mode = Math.floor(expected);
      least += (logs[mode] as number) - (mode === 0 ? 0 : mode * Math.log(expected));
    }
  }
  return Math.floor(least * (1 - 1e-12) * 2 ** scale) - 2 * rounding;
}

function entropy(totals: readonly number[]): number {
  return totals.reduce((sum, total) => sum + (total === 0 ? 0 : total * Math.log(total)), 0);
}

/** Each line filled from the largest cap on: the extreme of a convex sum. */
function mostFilled(
  caps: readonly number[],
  lines: readonly number[],
  { units }: LogFactorials,
): number {
  const fromLargest = [...caps].sort((one, other) => other - one);
  let most = 0;
  for (const line of lines) {
    let left = line;
    for (const cap of fromLargest) {
      const filled = Math.min(cap, left);
      most += units[filled] as number;
      left -= filled;
    }
  }
  return most;
}
