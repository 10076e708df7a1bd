import type { LogFactorials } from './log-factorials';

/**
 * Visits every way to spread a column over rows that hold at most so many: with the row totals that
 * are left (a list that is used again), the sum of the cells' log factorials in units, and the
 * logarithm of the ways to choose the column's members from the rows.
 */
export function visitSplits(
  rows: readonly number[],
  column: number,
  { units, logs }: LogFactorials,
  visit: (rest: readonly number[], units: number, logWays: number) => void,
): void {
  const room = roomAfter(rows);
  const rest = [...rows];
  const spread = (row: number, left: number, sum: number, logWays: number): void => {
    const total = rows[row] as number;
    const least = Math.max(0, left - (room[row] as number));
    for (let count = least; count <= Math.min(total, left); count += 1) {
      rest[row] = total - count;
      const nextSum = sum + (units[count] as number);
      const nextWays =
        logWays +
        (logs[total] as number) -
        (logs[count] as number) -
        (logs[total - count] as number);
      if (row === rows.length - 1) {
        visit(rest, nextSum, nextWays);
      } else {
        spread(row + 1, left - count, nextSum, nextWays);
      }
    }
  };
  spread(0, column, 0, 0);
}

/** How many the rows after each one can take. */
function roomAfter(rows: readonly number[]): readonly number[] {
  return rows.map((_, row) => rows.slice(row + 1).reduce((sum, total) => sum + total, 0));
}
