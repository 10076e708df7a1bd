import { failure, success, type Result } from '#shared/core';
import { stridesOf, type CellCounter } from './cell-grid';
import type { RowWeights } from './row-weights';
import type { LeftOut, Tally, TallyCell } from './tally';
import type { TallyGrid } from './tally-grid';
import type { TallyIssue } from './tally-issue';
import type { TallyPlan } from './tally-plan';

/** Turns counted cells into the tally: levels, records left out, records restricted away. */
export interface Fold {
  readonly add: (counter: CellCounter, weights: RowWeights) => void;
  readonly finish: () => Result<Tally, TallyIssue>;
}

/** Prepares to fold the cells of a grid along the axes of a plan. */
export function createFold(plan: TallyPlan, grid: TallyGrid): Fold {
  const sums = { cells: new Map<number, number>(), leftOut: emptyReasons(plan), restricted: 0 };
  const classesAt = cellReader(plan, grid);
  const add: Fold['add'] = (counter, { outcomeLevel }) => {
    const kept = outcomeIsKept(plan, outcomeLevel);
    counter.visit((cell, count) => {
      const classes = kept ? classesAt(cell, outcomeLevel) : null;
      if (classes === null) sums.restricted += count;
      else addTo(sums, plan, classes, count);
    });
  };
  return { add, finish: () => tallyOf(plan, sums) };
}

interface Sums {
  readonly cells: Map<number, number>;
  /** By axis, then by reason. */
  readonly leftOut: readonly Float64Array[];
  restricted: number;
}

function emptyReasons(plan: TallyPlan): readonly Float64Array[] {
  return plan.axes.map(({ reasons }) => new Float64Array(reasons.length));
}

function outcomeIsKept({ restrictions }: TallyPlan, outcomeLevel: number | null): boolean {
  return restrictions
    .filter(({ codes }) => codes === null)
    .every(({ passes }) => passes[outcomeLevel ?? 0] === 1);
}

/** Gives the classes of a cell, one an axis; null for a cell that restrictions exclude. */
function cellReader(
  plan: TallyPlan,
  grid: TallyGrid,
): (cell: number, outcomeLevel: number | null) => readonly number[] | null {
  const strides = stridesOf(grid.digits);
  const valueAt = (cell: number, place: number): number =>
    Math.floor(cell / (strides[place] ?? 1)) % (grid.digits[place]?.size ?? 1);
  const passingPlace = grid.passing === null ? null : grid.digits.length - 1;
  return (cell, outcomeLevel) => {
    if (passingPlace !== null && valueAt(cell, passingPlace) === 0) return null;
    const classes = plan.axes.map(({ classOf }) => classOf[outcomeLevel ?? 0] ?? 0);
    grid.axes.forEach(({ axis, map }, place) => {
      const value = valueAt(cell, place);
      classes[axis] = map === null ? (plan.axes[axis]?.classOf[value] ?? 0) : value;
    });
    return classes;
  };
}

function addTo(sums: Sums, plan: TallyPlan, classes: readonly number[], count: number): void {
  const lacking = plan.axes.findIndex(({ levelIds }, at) => (classes[at] ?? 0) >= levelIds.length);
  if (lacking < 0) {
    const key = keyOf(plan, classes);
    sums.cells.set(key, (sums.cells.get(key) ?? 0) + count);
    return;
  }
  const reason = (classes[lacking] ?? 0) - (plan.axes[lacking]?.levelIds.length ?? 0);
  const reasons = sums.leftOut[lacking];
  if (reasons !== undefined) reasons[reason] = (reasons[reason] ?? 0) + count;
}

function keyOf({ axes }: TallyPlan, places: readonly number[]): number {
  return axes.reduce((key, { levelIds }, at) => key * levelIds.length + (places[at] ?? 0), 0);
}

function placesOf({ axes }: TallyPlan, key: number): readonly number[] {
  let rest = key;
  return axes
    .toReversed()
    .map(({ levelIds }) => {
      const place = rest % levelIds.length;
      rest = (rest - place) / levelIds.length;
      return place;
    })
    .reverse();
}

function tallyOf(plan: TallyPlan, sums: Sums): Result<Tally, TallyIssue> {
  const keys = [...sums.cells.keys()].sort((one, other) => one - other);
  const cells = keys.map((key): TallyCell => ({
    at: placesOf(plan, key),
    count: sums.cells.get(key) ?? 0,
  }));
  const leftOut = leftOutOf(plan, sums);
  const counted = total(cells);
  const whole = counted + sums.restricted + total(leftOut);
  if (!Number.isSafeInteger(whole)) return failure({ code: 'countsTooLarge' });
  const axes = plan.axes.map(({ columnId, levelIds }) => ({ columnId, levelIds }));
  return success({ axes, cells, counted, restricted: sums.restricted, leftOut });
}

function leftOutOf({ axes }: TallyPlan, { leftOut }: Sums): readonly LeftOut[] {
  return axes.flatMap(({ columnId, reasons }, axis) =>
    reasons
      .map((reason, at) => ({ columnId, reason, count: leftOut[axis]?.[at] ?? 0 }))
      .filter(({ count }) => count > 0),
  );
}

function total(parts: readonly { readonly count: number }[]): number {
  return parts.reduce((sum, { count }) => sum + count, 0);
}
