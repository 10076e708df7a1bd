/** An urn with `marked` and `unmarked` members, of which `drawn` are taken. */
export interface Urn {
  readonly marked: number;
  readonly unmarked: number;
  readonly drawn: number;
}

/**
 * Logarithm of the hypergeometric probability of `count` marked members among the drawn.
 *
 * Takes whole numbers with `count` in the support. Good to 1e-11 absolute for urns of 10 million,
 * where a difference of log-gammas (and jstat's loop) loses eight digits.
 * Source: Loader C (2000), Fast and accurate computation of binomial probabilities.
 */
export function logHypergeometric(count: number, urn: Urn): number {
  const total = urn.marked + urn.unmarked;
  return logHypergeometricWeight(count, urn) - logBinomial(urn.drawn, total, urn.drawn / total);
}

/** The logarithm of the probability but for a term that all counts of an urn share. */
export function logHypergeometricWeight(count: number, { marked, unmarked, drawn }: Urn): number {
  const share = drawn / (marked + unmarked);
  return logBinomial(count, marked, share) + logBinomial(drawn - count, unmarked, share);
}

/** Hypergeometric probability of `count` marked members among the drawn; 0 outside the support. */
export function hypergeometricProbability(count: number, urn: Urn): number {
  const { smallest, largest } = hypergeometricSupport(urn);
  return count < smallest || count > largest ? 0 : Math.exp(logHypergeometric(count, urn));
}

/** The smallest and the largest count that an urn can give. */
export function hypergeometricSupport(urn: Urn): { smallest: number; largest: number } {
  return {
    smallest: Math.max(0, urn.drawn - urn.unmarked),
    largest: Math.min(urn.marked, urn.drawn),
  };
}

/** Logarithm of the binomial probability, for a share strictly between 0 and 1. */
export function logBinomial(count: number, trials: number, share: number): number {
  if (count === 0) {
    return trials === 0 ? 0 : trials * Math.log1p(-share);
  }
  if (count === trials) {
    return trials * Math.log(share);
  }
  const rest = trials - count;
  return (
    stirlingError(trials) -
    stirlingError(count) -
    stirlingError(rest) -
    deviance(count, trials * share) -
    deviance(rest, trials * (1 - share)) -
    0.5 * Math.log((2 * Math.PI * count * rest) / trials)
  );
}

/** log(n!) less Stirling's approximation, also between whole numbers; good to 1e-14. */
export function stirlingError(n: number): number {
  return n < SERIES_FROM ? (STIRLING_ERRORS[2 * n] ?? errorBySteps(n)) : errorBySeries(n);
}

/** The series is good to 1e-16 from here on. */
const SERIES_FROM = 16;

function errorBySeries(n: number): number {
  const square = n * n;
  const fifth = 1 / 1260 - (1 / 1680 - 1 / 1188 / square) / square;
  return (1 / 12 - (1 / 360 - fifth / square) / square) / n;
}

/** By the factors between a number and one for which the series will do; 0 at 0, by agreement. */
function errorBySteps(n: number): number {
  let [high, product] = [n, 1];
  while (high < SERIES_FROM) {
    high += 1;
    product *= high;
  }
  return n === 0 ? 0 : errorBySeries(high) + stirling(high) - Math.log(product) - stirling(n);
}

function stirling(n: number): number {
  return (n + 0.5) * Math.log(n) - n + 0.5 * Math.log(2 * Math.PI);
}

/** Of 0, 1/2, 1 and so on. */
const STIRLING_ERRORS: readonly number[] = Array.from({ length: 2 * SERIES_FROM }, (_, twice) =>
  errorBySteps(twice / 2),
);

/** x log(x / mean) + mean - x, without cancellation where x is near the mean. */
export function deviance(x: number, mean: number): number {
  const difference = x - mean;
  if (Math.abs(difference) >= 0.1 * (x + mean)) {
    return x * Math.log(x / mean) + mean - x;
  }
  const ratio = difference / (x + mean);
  let sum = difference * ratio;
  let power = 2 * x * ratio;
  for (let odd = 3; ; odd += 2) {
    power *= ratio * ratio;
    const next = sum + power / odd;
    if (next === sum) {
      return sum;
    }
    sum = next;
  }
}
