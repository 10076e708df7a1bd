/** The counts from one to another, both included. */
export interface CountRange {
  readonly from: number;
  readonly to: number;
}

/**
 * Binomial probabilities of one number of trials, again and again: each `fill` writes those of
 * another chance into the same `terms` and says which counts it wrote. The others have
 * probabilities below `negligible` times the largest; their terms are not to be read.
 */
export interface BinomialTerms {
  readonly terms: Float64Array;
  fill(chance: number): CountRange;
  /** The same as multiples of the largest probability, not yet brought to the sum of 1. */
  fillRelative(chance: number): CountRange;
}

/**
 * Binomial probabilities of `trials` by the ratios of neighbours from the mode outwards, brought to
 * the sum of 1: good to 1e-13 relative, without logarithms.
 */
export function binomialTerms(trials: number, negligible: number): BinomialTerms {
  const terms = new Float64Array(trials + 1);
  const up = Float64Array.from({ length: trials }, (_, count) => (trials - count) / (count + 1));
  const down = Float64Array.from({ length: trials }, (_, count) => (count + 1) / (trials - count));
  const fillRelative = (chance: number): CountRange => {
    const odds = chance / (1 - chance);
    const mode = Math.min(trials, Math.floor((trials + 1) * chance));
    const from = downwards(terms, down, mode, 1 / odds, negligible);
    const to = upwards(terms, up, mode, odds, negligible);
    return { from, to };
  };
  return {
    terms,
    fill(chance) {
      const range = fillRelative(chance);
      bringToOne(terms, range);
      return range;
    },
    fillRelative,
  };
}

function upwards(
  terms: Float64Array,
  up: Float64Array,
  mode: number,
  odds: number,
  negligible: number,
): number {
  let term = 1;
  let count = mode;
  terms[mode] = 1;
  while (count < up.length) {
    term *= (up[count] as number) * odds;
    if (term <= negligible) {
      break;
    }
    count += 1;
    terms[count] = term;
  }
  return count;
}

function downwards(
  terms: Float64Array,
  down: Float64Array,
  mode: number,
  inverseOdds: number,
  negligible: number,
): number {
  let term = 1;
  let count = mode;
  while (count > 0) {
    term *= inverseOdds * (down[count - 1] as number);
    if (term <= negligible) {
      break;
    }
    count -= 1;
    terms[count] = term;
  }
  return count;
}

function bringToOne(terms: Float64Array, { from, to }: CountRange): void {
  let sum = 0;
  for (let count = from; count <= to; count += 1) {
    sum += terms[count] as number;
  }
  for (let count = from; count <= to; count += 1) {
    terms[count] = (terms[count] as number) / sum;
  }
}
