import type { ScoredGroup } from '#shared/stats';

/** Counts by row and column. */
export type Rows = readonly (readonly number[])[];

/** The exact p from whole numbers only: every table with the margins, by multinomial weights. */
export function enumeratedTables(rows: Rows): number {
  const margins = rows.map((row) => row.reduce((sum, count) => sum + count, 0));
  const columns = turned(rows);
  const observed = columns.reduce((product, column) => product * ways(column), 1n);
  let tail = 0n;
  let all = 0n;
  const fill = (at: number, left: readonly number[], weight: bigint): void => {
    if (at === columns.length) {
      all += weight;
      tail += weight <= observed ? weight : 0n;
      return;
    }
    const size = columns[at]!.reduce((sum, count) => sum + count, 0);
    for (const column of spreads(size, left)) {
      fill(
        at + 1,
        left.map((count, row) => count - column[row]!),
        weight * ways(column),
      );
    }
  };
  fill(0, margins, 1n);
  return ratio(tail, all);
}

function spreads(
  size: number,
  [first, ...rest]: readonly number[],
): readonly (readonly number[])[] {
  if (first === undefined) {
    return size === 0 ? [[]] : [];
  }
  const counts = Array.from({ length: Math.min(first, size) + 1 }, (_, count) => count);
  return counts.flatMap((count) => spreads(size - count, rest).map((other) => [count, ...other]));
}

/** Multinomial coefficient. */
function ways(column: readonly number[]): bigint {
  const size = column.reduce((sum, count) => sum + count, 0);
  return column.reduce((product, count) => product / factorial(count), factorial(size));
}

function factorial(count: number): bigint {
  return count < 2 ? 1n : BigInt(count) * factorial(count - 1);
}

/** The exact trend's p from whole numbers only. */
export function enumeratedTrend(list: readonly ScoredGroup[]): number {
  const sum = (part: (group: ScoredGroup) => number): number =>
    list.reduce((total, group) => total + part(group), 0);
  const events = sum((group) => group.events);
  const total = sum((group) => group.total);
  const centre = events * sum((group) => group.total * group.score);
  const distance = (scores: number): number => Math.abs(total * scores - centre);
  const observed = distance(sum((group) => group.events * group.score));
  let tail = 0n;
  let all = 0n;
  for (const counts of spreads(
    events,
    list.map((group) => group.total),
  )) {
    const weight = list.reduce(
      (product, group, at) => product * ways([counts[at]!, group.total - counts[at]!]),
      1n,
    );
    const scores = list.reduce((value, group, at) => value + group.score * counts[at]!, 0);
    all += weight;
    tail += distance(scores) >= observed ? weight : 0n;
  }
  return ratio(tail, all);
}

function ratio(part: bigint, whole: bigint): number {
  const scale = 10n ** 30n;
  return Number((part * scale) / whole) / Number(scale);
}

/** Rows and columns exchanged. */
export function turned(rows: Rows): Rows {
  return rows[0]!.map((_, column) => rows.map((row) => row[column]!));
}
