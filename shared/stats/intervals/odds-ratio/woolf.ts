import { cellsOf } from '../../check-counts';
import type { FourfoldTable } from '../../fourfold-table';
import { oddsRatioOf } from '../../point-estimates';
import { issueOfLogOddsRatio, oddsRatioMethod } from './odds-ratio-method';

/**
 * Woolf's log interval for an odds ratio, index over reference.
 *
 * Takes events and totals of two independent groups; gives ratios. Any zero cell gives the issue
 * `zeroCell` (nothing is added to cells), an empty group `emptyGroup`.
 *
 * Source: Woolf (1955) Annals of Human Genetics 19:251-253.
 * Example: 189/11034 against 104/11037 at level 0.95 gives 1.4400 to 2.3308.
 */
export const woolf = oddsRatioMethod(
  {
    id: 'woolf',
    label: 'Woolf log',
    shortLabel: 'Woolf log',
    citation:
      'Woolf B. On estimating the relation between blood group and disease. ' +
      'Annals of Human Genetics 1955;19:251-253.',
    limits(table, z) {
      const ratio = oddsRatioOf(table);
      const factor = Math.exp(z * Math.sqrt(varianceOfLog(table)));
      return [ratio / factor, ratio * factor];
    },
  },
  issueOfLogOddsRatio,
);

function varianceOfLog(table: FourfoldTable): number {
  const cells = cellsOf(table);
  return (
    1 / cells.indexEvents +
    1 / cells.indexOthers +
    1 / cells.referenceEvents +
    1 / cells.referenceOthers
  );
}
