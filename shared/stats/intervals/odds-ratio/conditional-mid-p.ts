import { conditionalLimits, conditionalOddsRatioOf } from '../../conditional';
import { oddsRatioMethod } from './odds-ratio-method';

/**
 * Mid-p conditional interval for an odds ratio, index over reference, around the conditional
 * maximum likelihood estimate (`pointOf`): as the exact one, but with the observed number counted
 * by half in either tail, which takes away most of the excess coverage.
 *
 * Takes events and totals of two independent groups of any size; gives ratios, good to 1e-12.
 * Estimate and lower limit are 0 at the lower end of what the margins allow. At the upper end
 * `zeroCell`, with the lower limit as `atLeast`; an empty group gives `emptyGroup`.
 *
 * Source: Mehta and Walsh (1992) The American Statistician 46:146-150.
 * Example: 3/4 against 1/4 at level 0.95 gives 6.4083 (0.3101 to 308.56).
 */
export const conditionalMidP = oddsRatioMethod({
  id: 'conditionalMidP',
  label: 'Conditional maximum likelihood with mid-p limits',
  shortLabel: 'mid-p conditional',
  citation:
    'Mehta CR, Walsh SJ. Comparison of exact, mid-p, and Mantel–Haenszel confidence intervals ' +
    'for the common odds ratio across several 2 × 2 contingency tables. ' +
    'The American Statistician 1992;46:146-150.',
  pointOf: conditionalOddsRatioOf,
  limits: (table, _z, level) => conditionalLimits(table, level, 0.5),
});
