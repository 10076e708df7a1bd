import { issueOfTable } from '../../../check-counts';
import { pooledRiskDifference } from '../../mantel-haenszel-difference';
import type { PoolingMethod } from '../pooling-method';

/**
 * Mantel–Haenszel risk difference with Sato's variance, which holds for sparse and large strata.
 *
 * Takes events and totals by stratum; gives a proportion in [-1, 1] with limits. Without a stratum
 * in which both groups hold someone: `noInformativeStratum`.
 *
 * Source: Sato (1989) Biometrics 45:1323-1324.
 * Example: 8/106 v 5/120 and 22/98 v 16/85 at level 0.95 give 0.0349 (-0.0276 to 0.0974).
 */
export const sato = {
  id: 'sato',
  label: "Mantel–Haenszel risk difference with Sato's variance",
  shortLabel: 'Mantel–Haenszel (Sato)',
  citation:
    'Sato T. On the variance estimator for the Mantel–Haenszel risk difference. ' +
    'Biometrics 1989;45:1323-1324.',
  issueOfStratum: issueOfTable,
  pooled: (strata, level) => pooledRiskDifference(strata, level, 'sato'),
} as const satisfies PoolingMethod;
