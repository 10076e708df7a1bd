import {
  UNCONDITIONAL_CAP,
  issueOfUnconditional,
  unconditionalDifferenceLimits,
} from '../../unconditional';
import { riskDifferenceMethod } from './risk-difference-method';

/**
 * Agresti and Min's exact unconditional interval for a risk difference, index minus reference: from
 * the smallest to the largest difference that one two-sided test of the score statistic does not
 * refuse. Mostly shorter than Chan and Zhang's; the two tails need not be equal.
 *
 * Takes events and totals of two independent groups; gives proportions in [-1, 1], found to 1e-10.
 * Coverage is never below the level. Defined for zero and full cells; an empty group gives
 * `emptyGroup`, a group of more than 500 `tooLarge`.
 *
 * Source: Agresti and Min (2001) Biometrics 57:963-971.
 * Example: 7/34 against 1/34 at level 0.95 gives 0.0237 to 0.3538.
 */
export const agrestiMin = riskDifferenceMethod(
  {
    id: 'agrestiMin',
    label: 'Agresti–Min exact unconditional (one two-sided test)',
    shortLabel: 'Agresti–Min exact',
    citation:
      'Agresti A, Min Y. On small-sample confidence intervals for parameters in discrete ' +
      'distributions. Biometrics 2001;57:963-971.',
    effort: 'heavy',
    groupCap: UNCONDITIONAL_CAP.groupCap,
    limits: (table, _z, level) => unconditionalDifferenceLimits(table, 'both', level),
  },
  issueOfUnconditional,
);
