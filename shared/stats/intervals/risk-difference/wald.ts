import type { GroupCount } from '../../fourfold-table';
import { riskDifferenceOf } from '../../point-estimates';
import { clampLimits } from '../clamp';
import { riskDifferenceMethod } from './risk-difference-method';

/**
 * Wald's interval for a risk difference, index minus reference, cut to [-1, 1].
 *
 * Takes events and totals of two independent groups. Its width is zero when both risks are 0 or 1;
 * an empty group gives the issue `emptyGroup`.
 *
 * Source: as method 1 in Newcombe (1998) Statistics in Medicine 17:873-890.
 * Example: 56/70 against 48/80 at level 0.95 gives 0.0575 to 0.3425.
 */
export const wald = riskDifferenceMethod({
  id: 'wald',
  label: 'Wald',
  shortLabel: 'Wald',
  citation:
    'Newcombe RG. Interval estimation for the difference between independent proportions: ' +
    'comparison of eleven methods. Statistics in Medicine 1998;17:873-890, method 1.',
  limits(table, z) {
    const difference = riskDifferenceOf(table);
    const spread = z * Math.sqrt(varianceOfRisk(table.index) + varianceOfRisk(table.reference));
    return clampLimits([difference - spread, difference + spread], -1, 1);
  },
});

function varianceOfRisk({ events, total }: GroupCount): number {
  return ((events / total) * ((total - events) / total)) / total;
}
