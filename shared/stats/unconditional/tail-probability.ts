import { binomialTerms } from '../distributions';
import type { BinomialTerms, CountRange } from '../distributions';
import type { ExtremeTables } from './extreme-tables';

/** Chances of an event; the index group's may differ between the two sides of extreme tables. */
export interface Chances {
  readonly reference: number;
  readonly indexBelow: number;
  readonly indexAbove: number;
}

/** Probability of extreme tables under two independent binomial distributions. */
export type TailProbability = (extreme: ExtremeTables, chances: Chances) => number;

/**
 * The probability of extreme tables for groups of these sizes, in time proportional to the sum of
 * the two. Terms below `negligible` times the largest are left out.
 */
export function tailProbability(
  indexTotal: number,
  referenceTotal: number,
  negligible: number,
): TailProbability {
  const index = binomialTerms(indexTotal, negligible);
  const reference = binomialTerms(referenceTotal, negligible);
  const sums = new Float64Array(referenceTotal + 2);
  return ({ below, above }, chances) => {
    const range = reference.fill(chances.reference);
    const upwards = sumUp(reference, range, sums);
    const favouring = weighted(index, chances.indexBelow, below, upwards);
    if (above === null) {
      return favouring;
    }
    const downwards = sumDown(reference, range, sums);
    return favouring + weighted(index, chances.indexAbove, above, downwards);
  };
}

/** Sum over the index group's events of their probability times that of the reference's range. */
function weighted(
  binomial: BinomialTerms,
  chance: number,
  bounds: Int32Array,
  sumTo: (bound: number) => number,
): number {
  const { terms } = binomial;
  const { from, to } = binomial.fill(chance);
  let sum = 0;
  for (let events = from; events <= to; events += 1) {
    sum += (terms[events] as number) * sumTo(bounds[events] as number);
  }
  return sum;
}

/** Probability of at most so many events. */
function sumUp(
  { terms }: BinomialTerms,
  { from, to }: CountRange,
  sums: Float64Array,
): (bound: number) => number {
  let sum = 0;
  for (let events = from; events <= to; events += 1) {
    sum += terms[events] as number;
    sums[events] = sum;
  }
  return (bound) => (bound < from ? 0 : bound >= to ? 1 : (sums[bound] as number));
}

/** Probability of at least so many events. */
function sumDown(
  { terms }: BinomialTerms,
  { from, to }: CountRange,
  sums: Float64Array,
): (bound: number) => number {
  let sum = 0;
  for (let events = to; events >= from; events -= 1) {
    sum += terms[events] as number;
    sums[events] = sum;
  }
  return (bound) => (bound > to ? 0 : bound <= from ? 1 : (sums[bound] as number));
}
