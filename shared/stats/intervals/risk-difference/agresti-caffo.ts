import type { GroupCount } from '../../fourfold-table';
import { clampLimits } from '../clamp';
import { riskDifferenceMethod } from './risk-difference-method';

/**
 * Agresti and Caffo's adjusted Wald interval for a risk difference: one event and one other added
 * to each group, cut to [-1, 1].
 *
 * Takes events and totals of two independent groups; an empty group gives the issue `emptyGroup`.
 *
 * Source: Agresti and Caffo (2000) The American Statistician 54:280-288.
 * Example: 56/70 against 48/80 at level 0.95 gives 0.0525 to 0.3358.
 */
export const agrestiCaffo = riskDifferenceMethod({
  id: 'agrestiCaffo',
  label: 'Agresti–Caffo adjusted Wald',
  shortLabel: 'Agresti–Caffo',
  citation:
    'Agresti A, Caffo B. Simple and effective confidence intervals for proportions and ' +
    'differences of proportions result from adding two successes and two failures. ' +
    'The American Statistician 2000;54:280-288.',
  limits(table, z) {
    const index = adjusted(table.index);
    const reference = adjusted(table.reference);
    const difference = index.risk - reference.risk;
    const spread = z * Math.sqrt(index.variance + reference.variance);
    return clampLimits([difference - spread, difference + spread], -1, 1);
  },
});

function adjusted({ events, total }: GroupCount): { risk: number; variance: number } {
  const size = total + 2;
  const risk = (events + 1) / size;
  return { risk, variance: (risk * (1 - risk)) / size };
}
