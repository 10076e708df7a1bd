import { adjustByRank } from './adjustment';
import type { Adjustment } from './adjustment';

/**
 * Hochberg's step-up adjustment: Holm's factors, taken from the largest p-value back. Holds for
 * independent and for some positively dependent tests; never larger than Holm's.
 *
 * Source: Hochberg (1988) Biometrika 75:800-802.
 * Example: 0.01, 0.03, 0.04 give 0.03, 0.04, 0.04.
 */
export const hochberg = {
  id: 'hochberg',
  label: 'Hochberg step-up adjustment',
  shortLabel: 'Hochberg',
  citation:
    'Hochberg Y. A sharper Bonferroni procedure for multiple tests of significance. ' +
    'Biometrika 1988;75:800-802.',
  controls: 'familywiseError',
  adjust: (pValues) => adjustByRank(pValues, ({ place, count }) => count - place + 1, 'falling'),
} as const satisfies Adjustment;
