import { benjaminiHochberg } from './benjamini-hochberg';
import { bonferroni } from './bonferroni';
import { hochberg } from './hochberg';
import { holm } from './holm';

export type { Adjustment } from './adjustment';

/** Adjustments of p-values for the number of contrasts, in the order in which they are offered. */
export const ADJUSTMENTS = { holm, hochberg, benjaminiHochberg, bonferroni } as const;

/** Id of an adjustment. */
export type AdjustmentId = keyof typeof ADJUSTMENTS;

/**
 * P-values of a family of contrasts, adjusted for their number, in the same order. The family is
 * those that were tested: a contrast without a p-value is not one of them.
 */
export function adjustPValues(id: AdjustmentId, pValues: readonly number[]): readonly number[] {
  return ADJUSTMENTS[id].adjust(pValues);
}
