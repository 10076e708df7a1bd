import { cellsOf, type GridDigit } from './cell-grid';
import { MOST_PACKED_CELLS } from './count-bytes';
import type { PlannedAxis, PlannedRestriction, TallyPlan } from './tally-plan';

/** A digit for each axis that rows differ in, by its place among the axes. */
export interface AxisDigit extends GridDigit {
  readonly axis: number;
}

/**
 * The digits to count by. `passing` tells rows that meet every restriction (1) from others (0),
 * null without restrictions; it comes last. A digit with `map` gives classes, one without gives
 * codes.
 */
export interface TallyGrid {
  readonly axes: readonly AxisDigit[];
  readonly passing: GridDigit | null;
  readonly digits: readonly GridDigit[];
}

/** Chooses digits for a plan: codes as they are where that is cheap, else their classes. */
export function gridOf(plan: TallyPlan, rows: number): TallyGrid {
  const passing = passingDigit(plan.restrictions, rows);
  const plain = gridWith(plan, passing, ({ codes }) => codes instanceof Uint8Array);
  if (cellsOf(plain.digits) <= MOST_PACKED_CELLS) return plain;
  return gridWith(plan, passing, ({ classOf, ...axis }) => classOf.length <= classesOf(axis));
}

function gridWith(
  plan: TallyPlan,
  passing: GridDigit | null,
  asTheyAre: (axis: PlannedAxis) => boolean,
): TallyGrid {
  const axes = plan.axes.flatMap((planned, axis): readonly AxisDigit[] => {
    const { codes, classOf } = planned;
    if (codes === null) return [];
    return asTheyAre(planned)
      ? [{ axis, codes, size: classOf.length, map: null }]
      : [{ axis, codes, size: classesOf(planned), map: classOf }];
  });
  return { axes, passing, digits: passing === null ? axes : [...axes, passing] };
}

function classesOf({ levelIds, reasons }: Pick<PlannedAxis, 'levelIds' | 'reasons'>): number {
  return levelIds.length + reasons.length;
}

function passingDigit(restrictions: readonly PlannedRestriction[], rows: number): GridDigit | null {
  const byRow = restrictions.filter(({ codes }) => codes !== null);
  if (byRow.length === 0) return null;
  const codes = new Uint8Array(rows).fill(1);
  for (const restriction of byRow) dropRows(restriction, codes);
  return { size: 2, codes, map: null };
}

function dropRows({ codes, passes }: PlannedRestriction, passing: Uint8Array): void {
  if (codes === null) return;
  for (let row = 0; row < passing.length; row += 1) {
    passing[row] = (passing[row] ?? 0) & (passes[codes[row] ?? 0] ?? 0);
  }
}
