import { issueOfOddsRatioStratum } from '../../mantel-haenszel-ratios';
import { conditionalOddsRatio } from '../../conditional/conditional-odds-ratio';
import type { PoolingMethod } from '../pooling-method';

/**
 * The common odds ratio with exact limits: the conditional maximum likelihood, all margins of all
 * strata fixed.
 *
 * Takes events and totals by stratum; gives a ratio, 0 with lower limit 0 where no index member
 * could have fewer events. Strata as for Mantel–Haenszel; when none carries information:
 * `noInformativeStratum`; an infinite estimate: `zeroCell`; more than 20,000 possible numbers of
 * events among the index groups: `tooLarge` with the `cap` and what to use `instead`.
 *
 * Source: Gart (1970) Biometrika 57:471-475; Mehta, Patel and Gray (1985) Journal of the American
 * Statistical Association 80:969-973.
 * Example: 0/6 v 0/5, 3/6 v 0/6, 6/6 v 2/6, 5/6 v 6/6, 2/2 v 5/5 give 10.361 (1.077 to 531.5).
 */
export const exactConditional = {
  id: 'exactConditional',
  label: 'Conditional maximum likelihood odds ratio with exact limits',
  shortLabel: 'exact conditional',
  citation:
    'Mehta CR, Patel NR, Gray R. Computing an exact confidence interval for the common odds ' +
    'ratio in several 2 × 2 contingency tables. ' +
    'Journal of the American Statistical Association 1985;80:969-973.',
  issueOfStratum: issueOfOddsRatioStratum,
  pooled: (strata, level) =>
    conditionalOddsRatio(strata, level, { method: 'exactConditional', shareOfObserved: 1 }),
} as const satisfies PoolingMethod;
