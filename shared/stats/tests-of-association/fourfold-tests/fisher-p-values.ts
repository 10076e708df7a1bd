import { hypergeometricSupport } from '../../distributions';
import type { Urn } from '../../distributions';
import { noLikelierThan } from '../hypergeometric-ties';

/** Probabilities nearer than this, relative to their size, are compared exactly. */
const NEAR = 1e-9;

/**
 * Fisher's two-sided p-values, by the probability of tables, of every count that an urn can give,
 * from the smallest on.
 */
export function fisherPValues(urn: Urn): Float64Array {
  const { smallest, largest } = hypergeometricSupport(urn);
  const shares = sharesOf(urn, smallest, largest);
  const pValues = new Float64Array(shares.length);
  let [left, right, sum] = [0, shares.length - 1, 0];
  while (left < right) {
    const order = orderOf(left, right, shares, urn);
    const taken = [...(order <= 0 ? [left++] : []), ...(order >= 0 ? [right--] : [])];
    sum += taken.reduce((total, place) => total + (shares[place] as number), 0);
    for (const place of taken) {
      pValues[place] = sum;
    }
  }
  if (left === right) {
    pValues[left] = 1;
  }
  return pValues;
}

/** Whether the left (-1), the right (1) or neither (0) of two counts is less likely. */
function orderOf(left: number, right: number, shares: Float64Array, urn: Urn): number {
  const [atLeft, atRight] = [shares[left] as number, shares[right] as number];
  if (Math.abs(atLeft - atRight) > NEAR * atRight) {
    return atLeft < atRight ? -1 : 1;
  }
  const { smallest } = hypergeometricSupport(urn);
  const [one, other] = [smallest + left, smallest + right];
  const leftNoLikelier = noLikelierThan(other, urn)(one);
  const rightNoLikelier = noLikelierThan(one, urn)(other);
  return leftNoLikelier && rightNoLikelier ? 0 : leftNoLikelier ? -1 : 1;
}

/** Probabilities by the ratios of neighbours, outwards from the likeliest count. */
function sharesOf(urn: Urn, smallest: number, largest: number): Float64Array {
  const { marked, unmarked, drawn } = urn;
  const shares = new Float64Array(largest - smallest + 1);
  const ratioUp = (count: number): number =>
    ((marked - count) * (drawn - count)) / ((count + 1) * (unmarked - drawn + count + 1));
  const mode = Math.floor(((drawn + 1) * (marked + 1)) / (marked + unmarked + 2));
  shares[mode - smallest] = 1;
  for (let count = mode, term = 1; count < largest; count += 1) {
    term *= ratioUp(count);
    shares[count + 1 - smallest] = term;
  }
  for (let count = mode, term = 1; count > smallest; count -= 1) {
    term /= ratioUp(count - 1);
    shares[count - 1 - smallest] = term;
  }
  const total = shares.reduce((sum, share) => sum + share, 0);
  return shares.map((share) => share / total);
}

/** A probability as whole numbers. */
export interface ExactShare {
  readonly part: bigint;
  readonly whole: bigint;
}

/** Fisher's two-sided p-value of a count in whole numbers. */
export function fisherFraction(count: number, urn: Urn): ExactShare {
  const { smallest } = hypergeometricSupport(urn);
  const weights = exactWeights(urn);
  const given = weights[count - smallest] ?? 0n;
  return {
    part: weights.reduce((sum, weight) => (weight <= given ? sum + weight : sum), 0n),
    whole: weights.reduce((sum, weight) => sum + weight, 0n),
  };
}

/** Below 0, 0 or above 0 as one share is smaller than, equal to or larger than another. */
export function compareFractions(one: ExactShare, other: ExactShare): number {
  const difference = one.part * other.whole - other.part * one.whole;
  return difference === 0n ? 0 : difference < 0n ? -1 : 1;
}

/** Weights in proportion to the probabilities: products of ratios of neighbours, made whole. */
function exactWeights(urn: Urn): readonly bigint[] {
  const { marked, unmarked, drawn } = urn;
  const { smallest, largest } = hypergeometricSupport(urn);
  const weights = [choose(marked, smallest) * choose(unmarked, drawn - smallest)];
  for (let count = smallest; count < largest; count += 1) {
    const rise = BigInt(marked - count) * BigInt(drawn - count);
    const fall = BigInt(count + 1) * BigInt(unmarked - drawn + count + 1);
    weights.push(((weights.at(-1) ?? 0n) * rise) / fall);
  }
  return weights;
}

function choose(from: number, taken: number): bigint {
  let ways = 1n;
  for (let step = 1; step <= taken; step += 1) {
    ways = (ways * BigInt(from - taken + step)) / BigInt(step);
  }
  return ways;
}
