import { adjustByRank } from './adjustment';
import type { Adjustment } from './adjustment';

/**
 * Benjamini and Hochberg's step-up adjustment: p-values times their number over their rank, from
 * the largest back. Bounds the expected share of false findings among the findings, not the chance
 * of any false one; for independent and positively dependent tests.
 *
 * Source: Benjamini and Hochberg (1995) Journal of the Royal Statistical Society B 57:289-300.
 * Example: 0.01, 0.02, 0.04 give 0.03, 0.03, 0.04.
 */
export const benjaminiHochberg = {
  id: 'benjaminiHochberg',
  label: 'Benjamini–Hochberg adjustment for the false discovery rate',
  shortLabel: 'Benjamini–Hochberg',
  citation:
    'Benjamini Y, Hochberg Y. Controlling the false discovery rate: a practical and powerful ' +
    'approach to multiple testing. ' +
    'Journal of the Royal Statistical Society, Series B 1995;57:289-300.',
  controls: 'falseDiscovery',
  adjust: (pValues) => adjustByRank(pValues, ({ place, count }) => count / place, 'falling'),
} as const satisfies Adjustment;
