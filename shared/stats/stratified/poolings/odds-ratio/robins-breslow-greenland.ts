import { issueOfOddsRatioStratum, pooledOddsRatio } from '../../mantel-haenszel-ratios';
import type { PoolingMethod } from '../pooling-method';

/**
 * Mantel–Haenszel odds ratio with the variance of Robins, Breslow and Greenland.
 *
 * Takes events and totals by stratum; gives a ratio with limits. Strata with an empty group, or
 * with events in nobody or in everybody, carry no information; when none other is left:
 * `noInformativeStratum`. An estimate of 0 or infinity: `zeroCell`.
 *
 * Source: Robins, Breslow and Greenland (1986) Biometrics 42:311-323.
 * Example: the admissions data give 0.9047 (0.7719 to 1.0603).
 */
export const robinsBreslowGreenland = {
  id: 'robinsBreslowGreenland',
  label: 'Mantel–Haenszel odds ratio with the variance of Robins, Breslow and Greenland',
  shortLabel: 'Mantel–Haenszel (Robins–Breslow–Greenland)',
  citation:
    'Robins J, Breslow N, Greenland S. Estimators of the Mantel–Haenszel variance consistent ' +
    'in both sparse data and large-strata limiting models. Biometrics 1986;42:311-323.',
  issueOfStratum: issueOfOddsRatioStratum,
  pooled: pooledOddsRatio,
} as const satisfies PoolingMethod;
