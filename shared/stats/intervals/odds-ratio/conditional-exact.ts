import { conditionalLimits, conditionalOddsRatioOf } from '../../conditional';
import { oddsRatioMethod } from './odds-ratio-method';

/**
 * Exact conditional interval for an odds ratio, index over reference, around the conditional
 * maximum likelihood estimate (`pointOf`, which is not the ratio of the cross products): limits at
 * which the observed events or more extreme ones have half of 1 - level, all margins fixed.
 *
 * Takes events and totals of two independent groups of any size; gives ratios, good to 1e-12.
 * Estimate and lower limit are 0 at the lower end of what the margins allow. At the upper end
 * `zeroCell`, with the lower limit as `atLeast`; an empty group gives `emptyGroup`.
 *
 * Source: Cornfield (1956) Proceedings of the Third Berkeley Symposium 4:135-148.
 * Example: 3/4 against 1/4 at level 0.95 gives 6.4083 (0.2117 to 626.24).
 */
export const conditionalExact = oddsRatioMethod({
  id: 'conditionalExact',
  label: 'Conditional maximum likelihood with exact limits',
  shortLabel: 'exact conditional',
  citation:
    'Cornfield J. A statistical problem arising from retrospective studies. Proceedings of the ' +
    'Third Berkeley Symposium on Mathematical Statistics and Probability 1956;4:135-148.',
  pointOf: conditionalOddsRatioOf,
  limits: (table, _z, level) => conditionalLimits(table, level, 1),
});
