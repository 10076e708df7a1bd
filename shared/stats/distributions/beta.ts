import cumulative from '@stdlib/stats-base-dists-beta-cdf';
import quantile from '@stdlib/stats-base-dists-beta-quantile';
import { betaLowerQuantile } from './beta-lower-quantile';

/**
 * Beta quantile: the x with P(X <= x) = p, for shapes a, b > 0 and 0 < p < 1.
 *
 * Source: inverse regularised incomplete beta function (jstat's is good to 7 digits only), by some
 * quick steps where these do, as they do for groups of usual sizes.
 */
export function betaQuantile(probability: number, a: number, b: number): number {
  const quick =
    probability <= 0.5
      ? betaLowerQuantile(probability, a, b)
      : 1 - betaLowerQuantile(1 - probability, b, a);
  return Number.isNaN(quick) ? quantile(probability, a, b) : quick;
}

/** Beta distribution function P(X <= x), for shapes a, b > 0. */
export function betaCumulative(x: number, a: number, b: number): number {
  return cumulative(x, a, b);
}
