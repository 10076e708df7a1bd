import type { MethodWords } from '../intervals';

/**
 * A way to adjust the p-values of several contrasts for their number, a member of ADJUSTMENTS.
 *
 * `adjust` takes p-values in [0, 1] and gives as many adjusted ones, in the same order, each at
 * least the p-value itself and at most 1. No p-values give none; another number is a bug.
 */
export interface Adjustment extends MethodWords {
  /** What is held at the level that adjusted p-values are compared with. */
  readonly controls: 'familywiseError' | 'falseDiscovery';
  adjust(pValues: readonly number[]): readonly number[];
}

/** A p-value's place in the order, 1 for the smallest, among how many. */
export interface Rank {
  readonly place: number;
  readonly count: number;
}

/** Which neighbours an adjusted value must not pass: those before it, or those after it. */
export type Enforcing = 'rising' | 'falling';

/**
 * Multiplies p-values by factors of their ranks, at most 1, and keeps their order: from the
 * smallest on no adjusted value below an earlier one (`rising`), or from the largest back none
 * above a later one (`falling`).
 */
export function adjustByRank(
  pValues: readonly number[],
  factorOf: (rank: Rank) => number,
  enforcing: Enforcing,
): readonly number[] {
  const count = pValues.length;
  const ranked = pValues
    .map((pValue, at) => ({ pValue: checked(pValue), at }))
    .sort((one, other) => one.pValue - other.pValue)
    .map(({ pValue, at }, place) => ({
      at,
      product: Math.min(1, pValue * factorOf({ place: place + 1, count })),
    }));
  const adjusted = new Array<number>(count).fill(1);
  let bound = enforcing === 'rising' ? 0 : 1;
  for (const { at, product } of enforcing === 'rising' ? ranked : ranked.reverse()) {
    bound = enforcing === 'rising' ? Math.max(bound, product) : Math.min(bound, product);
    adjusted[at] = bound;
  }
  return adjusted;
}

function checked(pValue: number): number {
  if (pValue >= 0 && pValue <= 1) {
    return pValue;
  }
  throw new Error(`No p-value: ${pValue}`);
}
