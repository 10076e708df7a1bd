import erfc from '@stdlib/math-base-special-erfc';
import erfcinv from '@stdlib/math-base-special-erfcinv';

/**
 * Standard normal quantile: the z with P(Z <= z) = p.
 *
 * Takes a probability strictly between 0 and 1. Good to 1e-12 relative down to p = 1e-300.
 * Source: inverse complementary error function (a quantile through erfinv(2p - 1), as well as
 * jstat's, is lost below p = 1e-9).
 */
export function normalQuantile(probability: number): number {
  return -Math.SQRT2 * erfcinv(2 * probability);
}

/**
 * Standard normal distribution function P(Z <= z).
 *
 * Good to 1e-12 relative in the lower tail to the end of doubles.
 * Source: complementary error function (jstat's is 0 below z = -9).
 */
export function normalCumulative(z: number): number {
  return erfc(-z / Math.SQRT2) / 2;
}

/** Upper tail P(Z > z) of the standard normal distribution, without the loss of 1 - P(Z <= z). */
export function normalUpperTail(z: number): number {
  return erfc(z / Math.SQRT2) / 2;
}

/** The z of a two-sided interval at a level: 1.96 for 0.95. */
export function criticalValue(level: number): number {
  return -normalQuantile((1 - level) / 2);
}
