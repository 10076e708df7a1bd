import { betaCumulative } from './beta';
import { logBinomial } from './hypergeometric';

/**
 * Binomial probability of `count` among `trials`, for a share from 0 to 1; 0 outside the support.
 *
 * Source: Loader C (2000), Fast and accurate computation of binomial probabilities.
 */
export function binomialProbability(count: number, trials: number, share: number): number {
  if (count < 0 || count > trials) {
    return 0;
  }
  if (share === 0 || share === 1) {
    return count === share * trials ? 1 : 0;
  }
  return Math.exp(logBinomial(count, trials, share));
}

/** Binomial distribution function P(X <= count), by the incomplete beta function. */
export function binomialCumulative(count: number, trials: number, share: number): number {
  if (count < 0) {
    return 0;
  }
  return count >= trials ? 1 : betaCumulative(1 - share, trials - count, count + 1);
}
