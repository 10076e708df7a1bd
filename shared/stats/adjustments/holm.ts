import { adjustByRank } from './adjustment';
import type { Adjustment } from './adjustment';

/**
 * Holm's step-down adjustment: the smallest p-value times their number, the next times one less,
 * and so on, never below an earlier one. Holds whatever the dependence; never larger than
 * Bonferroni's.
 *
 * Source: Holm (1979) Scandinavian Journal of Statistics 6:65-70.
 * Example: 0.01, 0.02, 0.04 give 0.03, 0.04, 0.04.
 */
export const holm = {
  id: 'holm',
  label: 'Holm step-down adjustment',
  shortLabel: 'Holm',
  citation:
    'Holm S. A simple sequentially rejective multiple test procedure. ' +
    'Scandinavian Journal of Statistics 1979;6:65-70.',
  controls: 'familywiseError',
  adjust: (pValues) => adjustByRank(pValues, ({ place, count }) => count - place + 1, 'rising'),
} as const satisfies Adjustment;
