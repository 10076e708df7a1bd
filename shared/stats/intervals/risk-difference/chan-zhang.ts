import {
  UNCONDITIONAL_CAP,
  issueOfUnconditional,
  unconditionalDifferenceLimits,
} from '../../unconditional';
import { riskDifferenceMethod } from './risk-difference-method';

/**
 * Chan and Zhang's exact unconditional interval for a risk difference, index minus reference: the
 * differences that neither of two one-sided tests refuses, each at half of 1 - level, with tables
 * in the order of the score statistic and the largest probability over the unknown risks.
 *
 * Takes events and totals of two independent groups; gives proportions in [-1, 1], found to 1e-10.
 * Coverage is never below the level. Defined for zero and full cells; an empty group gives
 * `emptyGroup`, a group of more than 500 `tooLarge`.
 *
 * Source: Chan and Zhang (1999) Biometrics 55:1202-1209.
 * Example: 7/34 against 1/34 at level 0.95 gives 0.0194 to 0.3584.
 */
export const chanZhang = riskDifferenceMethod(
  {
    id: 'chanZhang',
    label: 'Chan–Zhang exact unconditional (two one-sided tests)',
    shortLabel: 'Chan–Zhang exact',
    citation:
      'Chan ISF, Zhang Z. Test-based exact confidence intervals for the difference of two ' +
      'binomial proportions. Biometrics 1999;55:1202-1209.',
    effort: 'heavy',
    groupCap: UNCONDITIONAL_CAP.groupCap,
    limits: (table, _z, level) => unconditionalDifferenceLimits(table, 'upper', level),
  },
  issueOfUnconditional,
);
