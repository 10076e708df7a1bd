import { adjustByRank } from './adjustment';
import type { Adjustment } from './adjustment';

/**
 * Bonferroni's adjustment: every p-value times their number.
 *
 * Source: Dunn (1961) Journal of the American Statistical Association 56:52-64.
 * Example: 0.01, 0.02, 0.04 give 0.03, 0.06, 0.12.
 */
export const bonferroni = {
  id: 'bonferroni',
  label: 'Bonferroni adjustment',
  shortLabel: 'Bonferroni',
  citation:
    'Dunn OJ. Multiple comparisons among means. ' +
    'Journal of the American Statistical Association 1961;56:52-64.',
  controls: 'familywiseError',
  adjust: (pValues) => adjustByRank(pValues, ({ count }) => count, 'rising'),
} as const satisfies Adjustment;
