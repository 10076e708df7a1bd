import type { FourfoldTable } from '../../fourfold-table';
import { riskRatioOf } from '../../point-estimates';
import { issueOfLogRiskRatio, riskRatioMethod } from './risk-ratio-method';

/**
 * Katz's log interval for a risk ratio, index over reference.
 *
 * Takes events and totals of two independent groups; gives ratios. A group without events gives
 * the issue `zeroCell` (nothing is added to cells), an empty group `emptyGroup`.
 *
 * Source: Katz, Baptista, Azen and Pike (1978) Biometrics 34:469-474.
 * Example: 27/122 against 44/487 at level 0.95 gives 1.5837 to 3.7887.
 */
export const katz = riskRatioMethod(
  {
    id: 'katz',
    label: 'Katz log',
    shortLabel: 'Katz log',
    citation:
      'Katz D, Baptista J, Azen SP, Pike MC. Obtaining confidence intervals for the risk ratio ' +
      'in cohort studies. Biometrics 1978;34:469-474.',
    limits(table, z) {
      const ratio = riskRatioOf(table);
      const factor = Math.exp(z * Math.sqrt(varianceOfLog(table)));
      return [ratio / factor, ratio * factor];
    },
  },
  issueOfLogRiskRatio,
);

function varianceOfLog({ index, reference }: FourfoldTable): number {
  return (
    (index.total - index.events) / index.total / index.events +
    (reference.total - reference.events) / reference.total / reference.events
  );
}
