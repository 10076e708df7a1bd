import { issueOfTable } from '../../../check-counts';
import { pooledRiskDifference } from '../../mantel-haenszel-difference';
import { GREENLAND_ROBINS } from '../greenland-robins-words';
import type { PoolingMethod } from '../pooling-method';

/**
 * Mantel–Haenszel risk difference with the variance of Greenland and Robins, for large strata.
 *
 * Takes events and totals by stratum; gives a proportion in [-1, 1] with limits. Without a stratum
 * in which both groups hold someone: `noInformativeStratum`.
 *
 * Source: Greenland and Robins (1985) Biometrics 41:55-68.
 * Example: 647/1269 v 2/29 and 41/69 v 19/51 at level 0.95 give 0.3294 (0.2281 to 0.4307).
 */
export const greenlandRobins = {
  ...GREENLAND_ROBINS,
  issueOfStratum: issueOfTable,
  pooled: (strata, level) => pooledRiskDifference(strata, level, 'greenlandRobins'),
} as const satisfies PoolingMethod;
