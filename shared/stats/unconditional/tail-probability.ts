import { binomialTerms } from '../distributions';
import type { CountRange } from '../distributions';
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
    sumUp(reference.terms, reference.fillRelative(chances.reference), sums);
    const rows = index.fillRelative(chances.indexBelow);
    const favouring = weightedBelow(index.terms, rows, below, sums);
    if (above === null) {
      return favouring;
    }
    const same = chances.indexAbove === chances.indexBelow;
    const others = same ? rows : index.fillRelative(chances.indexAbove);
    return favouring + weightedAbove(index.terms, others, above, sums);
  };
}

/** Place k: the sum of the terms of fewer than k events; the last place: of all. */
function sumUp(terms: Float64Array, { from, to }: CountRange, sums: Float64Array): void {
  let sum = 0;
  sums.fill(0, 0, from + 1);
  for (let events = from; events <= to; events += 1) {
    sum += terms[events] as number;
    sums[events + 1] = sum;
  }
  sums.fill(sum, to + 2);
}

/** The probability that the reference group has at most as many events as each row's bound. */
function weightedBelow(
  terms: Float64Array,
  { from, to }: CountRange,
  bounds: Int32Array,
  sums: Float64Array,
): number {
  let sum = 0;
  let weight = 0;
  for (let row = from; row <= to; row += 1) {
    const term = terms[row] as number;
    weight += term;
    sum += term * (sums[(bounds[row] as number) + 1] as number);
  }
  return sum / (weight * (sums[sums.length - 1] as number));
}

/** The probability that the reference group has at least as many events as each row's bound. */
function weightedAbove(
  terms: Float64Array,
  { from, to }: CountRange,
  bounds: Int32Array,
  sums: Float64Array,
): number {
  const all = sums[sums.length - 1] as number;
  let sum = 0;
  let weight = 0;
  for (let row = from; row <= to; row += 1) {
    const term = terms[row] as number;
    weight += term;
    sum += term * (all - (sums[bounds[row] as number] as number));
  }
  return sum / (weight * all);
}
