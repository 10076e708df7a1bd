import type { OccupiedCounts } from '../occupied-counts';
import { visitSplits } from './column-splits';
import { completionBounds } from './completion-bounds';
import type { CompletionBounds } from './completion-bounds';
import type { LogFactorials } from './log-factorials';
import { logFactorials } from './log-factorials';

/** What one has after some columns: the row totals left, and how one can have come there. */
interface Node {
  /** In rising order. */
  readonly rows: readonly number[];
  readonly bounds: CompletionBounds;
  /** Probability by the sum of log factorials so far. */
  readonly pasts: Map<number, number>;
}

/**
 * The probability, all margins fixed, of tables no likelier than the one observed; null when more
 * than `mostSteps` partial tables would have to be carried on.
 *
 * Columns are added one by one; partial tables with the same rows left (in any order) and the same
 * sum of log factorials are one. Those whose every completion is no likelier are counted whole,
 * those whose no completion is are dropped. A table counts as no likelier up to the rounding of the
 * sums, below 1e-7 of its probability; equal ones are equal without tolerance.
 */
export function tailOfTables(counts: OccupiedCounts, mostSteps: number): number | null {
  const logs = logFactorials(counts.total);
  const sumOfLogs = counts.rows.flat().reduce((sum, count) => sum + (logs.units[count] ?? 0), 0);
  const wanted = sumOfLogs - logs.rounding;
  const columns = [...counts.columnTotals].sort(falling);
  const rows = [...counts.rowTotals].sort(rising);
  let nodes: readonly Node[] = [{ rows, bounds: NOTHING_KNOWN, pasts: new Map([[0, 1]]) }];
  let tail = 0;
  let steps = 0;
  for (let place = 0; place < columns.length - 1; place += 1) {
    const stage = new Stage(columns.slice(place), counts.total, wanted, logs);
    for (const node of nodes) {
      stage.extend(node);
      if (steps + stage.steps > mostSteps) return null;
    }
    steps += stage.steps;
    tail += stage.counted;
    nodes = stage.open();
  }
  return Math.min(1, tail);
}

const NOTHING_KNOWN: CompletionBounds = { least: 0, most: 0 };
const rising = (one: number, other: number): number => one - other;
const falling = (one: number, other: number): number => other - one;

/** Adds one column to partial tables. */
class Stage {
  /** The probability of partial tables that count whole. */
  counted = 0;
  /** How many partial tables were looked at. */
  steps = 0;
  private readonly nodes = new Map<number | string, Node>();
  private readonly column: number;
  private readonly after: readonly number[];

  constructor(
    [column = 0, ...after]: readonly number[],
    private readonly total: number,
    private readonly wanted: number,
    private readonly logs: LogFactorials,
  ) {
    this.column = column;
    this.after = after;
  }

  /** Partial tables that are neither counted nor dropped. */
  open(): readonly Node[] {
    return [...this.nodes.values()].filter(({ pasts }) => pasts.size > 0);
  }

  extend({ rows, pasts }: Node): void {
    const { column, logs } = this;
    const past = sortedPast(pasts);
    const left = rows.reduce((sum, row) => sum + row, 0);
    const logOfAll =
      (logs.logs[left] ?? 0) - (logs.logs[column] ?? 0) - (logs.logs[left - column] ?? 0);
    const sorted = new Array<number>(rows.length).fill(0);
    visitSplits(rows, column, logs, (rest, units, logWays) => {
      insertAll(rest, sorted);
      this.move(past, units, Math.exp(logWays - logOfAll), this.nodeOf(sorted));
    });
  }

  private nodeOf(sorted: readonly number[]): Node {
    const key = keyOf(sorted, this.total);
    const known = this.nodes.get(key);
    if (known) {
      return known;
    }
    const rows = [...sorted];
    const node = { rows, bounds: completionBounds(rows, this.after, this.logs), pasts: new Map() };
    this.nodes.set(key, node);
    return node;
  }

  private move(past: SortedPast, units: number, share: number, { bounds, pasts }: Node): void {
    const whole = firstFrom(past.sums, this.wanted - units - bounds.least);
    const open = firstFrom(past.sums, this.wanted - units - bounds.most);
    this.counted += share * (past.from[whole] ?? 0);
    this.steps += 1 + whole - open;
    for (let at = open; at < whole; at += 1) {
      const sum = (past.sums[at] as number) + units;
      pasts.set(sum, (pasts.get(sum) ?? 0) + share * (past.shares[at] as number));
    }
  }
}

/** Puts numbers into a list of the same length, in rising order. */
function insertAll(numbers: readonly number[], sorted: number[]): void {
  for (let at = 0; at < numbers.length; at += 1) {
    const number = numbers[at] as number;
    let place = at;
    while (place > 0 && (sorted[place - 1] as number) > number) {
      sorted[place] = sorted[place - 1] as number;
      place -= 1;
    }
    sorted[place] = number;
  }
}

/** One number for a list of numbers up to a total where it is exact; text beyond. */
function keyOf(numbers: readonly number[], total: number): number | string {
  let key = 0;
  for (const number of numbers) {
    key = key * (total + 1) + number;
  }
  return key <= Number.MAX_SAFE_INTEGER ? key : numbers.join();
}

/** Pasts in the order of their sums, with the probability from each place to the end. */
interface SortedPast {
  readonly sums: Float64Array;
  readonly shares: Float64Array;
  readonly from: Float64Array;
}

function sortedPast(pasts: ReadonlyMap<number, number>): SortedPast {
  const sums = Float64Array.from(pasts.keys()).sort();
  const shares = sums.map((sum) => pasts.get(sum) ?? 0);
  const from = new Float64Array(sums.length + 1);
  for (let at = sums.length - 1; at >= 0; at -= 1) {
    from[at] = (from[at + 1] as number) + (shares[at] as number);
  }
  return { sums, shares, from };
}

/** The first place whose sum is at least so large. */
function firstFrom(sums: Float64Array, least: number): number {
  let low = 0;
  let high = sums.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((sums[middle] as number) >= least) {
      high = middle;
    } else {
      low = middle + 1;
    }
  }
  return low;
}
