import { issueOfOddsRatioStratum } from '../../mantel-haenszel-ratios';
import { conditionalOddsRatio } from '../../conditional/conditional-odds-ratio';
import type { PoolingMethod } from '../pooling-method';

/**
 * The common odds ratio with mid-p limits: as the exact ones, but only half of the probability of
 * the observed number counts towards its tail, so that they are shorter.
 *
 * Takes and gives what `exactConditional` does, with the same issues and the same cap.
 *
 * Source: Mehta and Walsh (1992) American Statistician 46:146-150.
 */
export const exactMidP = {
  id: 'exactMidP',
  label: 'Conditional maximum likelihood odds ratio with mid-p limits',
  shortLabel: 'conditional mid-p',
  citation:
    'Mehta CR, Walsh SJ. Comparison of exact, mid-p, and Mantel–Haenszel confidence intervals ' +
    'for the common odds ratio across several 2 × 2 contingency tables. ' +
    'American Statistician 1992;46:146-150.',
  issueOfStratum: issueOfOddsRatioStratum,
  pooled: (strata, level) =>
    conditionalOddsRatio(strata, level, { method: 'exactMidP', shareOfObserved: 0.5 }),
} as const satisfies PoolingMethod;
