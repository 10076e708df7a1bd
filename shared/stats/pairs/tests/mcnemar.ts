import { chiSquareUpperTail } from '../../distributions';
import { pairedTest } from './paired-test';

/**
 * McNemar's test, without continuity correction: chi-square on 1 degree of freedom.
 *
 * Source: McNemar (1947) Psychometrika 12:153-157.
 * Example: 59 both, 6 only first, 16 only second, 80 neither give 4.5455, p = 0.0330.
 */
export const mcnemar = pairedTest({
  id: 'mcnemar',
  label: "McNemar's test without continuity correction",
  shortLabel: 'McNemar',
  citation:
    'McNemar Q. Note on the sampling error of the difference between correlated proportions or ' +
    'percentages. Psychometrika 1947;12:153-157.',
  outcome({ onlyFirst, onlySecond }) {
    const difference = onlyFirst - onlySecond;
    const statistic = (difference / (onlyFirst + onlySecond)) * difference;
    return { statistic, degreesOfFreedom: 1, pValue: chiSquareUpperTail(statistic, 1) };
  },
});
