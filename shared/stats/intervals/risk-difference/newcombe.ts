import { riskDifferenceOf } from '../../point-estimates';
import { wilsonLimits } from '../risk/wilson';
import { riskDifferenceMethod } from './risk-difference-method';

/**
 * Newcombe's hybrid score interval for a risk difference, index minus reference.
 *
 * Takes events and totals of two independent groups; gives proportions in [-1, 1].
 * Defined for zero and full cells; an empty group gives the issue `emptyGroup`.
 *
 * Source: Newcombe (1998) Statistics in Medicine 17:873-890, method 10.
 * Example: 56/70 against 48/80 at level 0.95 gives 0.0524 to 0.3339.
 */
export const newcombe = riskDifferenceMethod({
  id: 'newcombe',
  label: 'Newcombe hybrid score',
  shortLabel: 'Newcombe',
  citation:
    'Newcombe RG. Interval estimation for the difference between independent proportions: ' +
    'comparison of eleven methods. Statistics in Medicine 1998;17:873-890, method 10.',
  limits(table, z) {
    const difference = riskDifferenceOf(table);
    const indexRisk = table.index.events / table.index.total;
    const referenceRisk = table.reference.events / table.reference.total;
    const [indexLower, indexUpper] = wilsonLimits(table.index, z);
    const [referenceLower, referenceUpper] = wilsonLimits(table.reference, z);
    return [
      difference - Math.hypot(indexRisk - indexLower, referenceUpper - referenceRisk),
      difference + Math.hypot(indexUpper - indexRisk, referenceRisk - referenceLower),
    ];
  },
});
