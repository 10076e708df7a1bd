import { issueOfRiskRatioStratum, pooledRiskRatio } from '../../mantel-haenszel-ratios';
import { GREENLAND_ROBINS } from '../greenland-robins-words';
import type { PoolingMethod } from '../pooling-method';

/**
 * Mantel–Haenszel risk ratio with the variance of Greenland and Robins.
 *
 * Takes events and totals by stratum; gives a ratio with limits. Strata with an empty group or
 * without events carry no information; when none other is left: `noInformativeStratum`. No events
 * in one of the groups over all strata: `zeroCell`.
 *
 * Source: Greenland and Robins (1985) Biometrics 41:55-68.
 * Example: 647/1269 v 2/29 and 41/69 v 19/51 at level 0.95 give 2.4751 (1.5831 to 3.8698).
 */
export const greenlandRobins = {
  ...GREENLAND_ROBINS,
  issueOfStratum: issueOfRiskRatioStratum,
  pooled: pooledRiskRatio,
} as const satisfies PoolingMethod;
