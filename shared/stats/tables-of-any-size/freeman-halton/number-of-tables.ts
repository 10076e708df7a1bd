/**
 * A bound from above on how many tables have the given margins: the ways to spread every column but
 * the one with most ways over the rows, as if the others were not there.
 */
export function mostTables(rows: readonly number[], columns: readonly number[]): number {
  const ways = columns.map((column) => waysToSpread(column, rows));
  const largest = Math.max(...ways);
  return ways.reduce((product, one) => product * one, 1) / largest;
}

/** In how many ways rows with such totals can hold so many. */
function waysToSpread(column: number, rows: readonly number[]): number {
  let ways = [1, ...new Array<number>(column).fill(0)];
  for (const row of rows) {
    let window = 0;
    ways = ways.map((way, held) => {
      window += way - (held > row ? (ways[held - row - 1] ?? 0) : 0);
      return window;
    });
  }
  return ways[column] ?? 0;
}
