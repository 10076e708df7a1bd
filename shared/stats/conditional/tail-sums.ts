import type { ValueAndSlope } from './newton';

/**
 * The events of an index group (or of those of all strata) given all margins, at some odds ratio,
 * seen from the observed number:
 * probabilities of fewer, as many and more; sums of probability times distance of those below
 * (negative) and above, and of probability times squared distance.
 */
export interface ConditionalCounts {
  readonly below: number;
  readonly at: number;
  readonly above: number;
  readonly momentBelow: number;
  readonly momentAbove: number;
  readonly squares: number;
}

/** The same before they are divided by the sum of all terms. */
export type ConditionalSums = { -readonly [Part in keyof ConditionalCounts]: number };

/** Nothing added yet. */
export function emptySums(): ConditionalSums {
  return { below: 0, at: 0, above: 0, momentBelow: 0, momentAbove: 0, squares: 0 };
}

/** Adds a term at a distance from the observed number. */
export function addTerm(sums: ConditionalSums, distance: number, term: number): void {
  if (distance < 0) {
    sums.below += term;
    sums.momentBelow += term * distance;
  } else if (distance > 0) {
    sums.above += term;
    sums.momentAbove += term * distance;
  } else {
    sums.at += term;
  }
  sums.squares += term * distance * distance;
}

/** Sums as shares of all terms. */
export function sharesOf(sums: ConditionalSums): ConditionalCounts {
  const total = sums.below + sums.at + sums.above;
  return {
    below: sums.below / total,
    at: sums.at / total,
    above: sums.above / total,
    momentBelow: sums.momentBelow / total,
    momentAbove: sums.momentAbove / total,
    squares: sums.squares / total,
  };
}

/** The expected less the observed number; its slope is the variance. */
export function meanDistance({
  momentBelow,
  momentAbove,
  squares,
}: ConditionalCounts): ValueAndSlope {
  const excess = momentBelow + momentAbove;
  return { value: excess, slope: squares - excess * excess };
}
