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
  const sums = new Float64Array(referenceTotal + 3);
  return ({ below, above }, chances) => {
    const range = reference.fill(chances.reference);
    sumUp(reference.terms, range, sums);
    const rows = index.fill(chances.indexBelow);
    const favouring = weighted(index.terms, rows, below, { ...range, sums });
    if (above === null) {
      return favouring;
    }
    sumDown(reference.terms, range, sums);
    const same = chances.indexAbove === chances.indexBelow;
    const others = same ? rows : index.fill(chances.indexAbove);
    return favouring + weighted(index.terms, others, above, { ...range, sums });
  };
}

/** Probabilities of the reference group's events up to, or from, each place of a range. */
interface Sums extends CountRange {
  readonly sums: Float64Array;
}

/**
 * Sum over the index group's events of their probability times that of the reference's range. The
 * bounds are cut to the range's ends, beyond which the sums stand still.
 */
function weighted(
  terms: Float64Array,
  rows: CountRange,
  bounds: Int32Array,
  { from, to, sums }: Sums,
): number {
  let sum = 0;
  for (let row = rows.from; row <= rows.to; row += 1) {
    const bound = bounds[row] as number;
    const place = bound < from ? 0 : Math.min(bound, to + 1) - from + 1;
    sum += (terms[row] as number) * (sums[place] as number);
  }
  return sum;
}

/** Place 0: nothing; place k: the first k counts of the range; beyond the last count: all. */
function sumUp(terms: Float64Array, { from, to }: CountRange, sums: Float64Array): void {
  let sum = 0;
  sums[0] = 0;
  for (let events = from; events <= to; events += 1) {
    sum += terms[events] as number;
    sums[events - from + 1] = sum;
  }
  sums[to - from + 2] = sum;
}

/** Place 0: all; place k: the range from its k-th count on; beyond the last count: nothing. */
function sumDown(terms: Float64Array, { from, to }: CountRange, sums: Float64Array): void {
  let sum = 0;
  sums[to - from + 2] = 0;
  for (let events = to; events >= from; events -= 1) {
    sum += terms[events] as number;
    sums[events - from + 1] = sum;
  }
  sums[0] = sum;
}
