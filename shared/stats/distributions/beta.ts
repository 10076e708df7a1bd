import cumulative from '@stdlib/stats-base-dists-beta-cdf';
import quantile from '@stdlib/stats-base-dists-beta-quantile';

/**
 * Beta quantile: the x with P(X <= x) = p, for shapes a, b > 0 and 0 < p < 1.
 *
 * Source: inverse regularised incomplete beta function (jstat's is good to 7 digits only).
 */
export function betaQuantile(probability: number, a: number, b: number): number {
  return quantile(probability, a, b);
}

/** Beta distribution function P(X <= x), for shapes a, b > 0. */
export function betaCumulative(x: number, a: number, b: number): number {
  return cumulative(x, a, b);
}
