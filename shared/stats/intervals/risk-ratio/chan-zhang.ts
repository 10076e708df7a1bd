import {
  UNCONDITIONAL_CAP,
  issueOfUnconditional,
  unconditionalRatioLimits,
} from '../../unconditional';
import { issueOfRiskRatio, riskRatioMethod } from './risk-ratio-method';

/**
 * Exact unconditional interval for a risk ratio, index over reference, in Chan and Zhang's way: the
 * ratios that neither of two one-sided tests refuses, each at half of 1 - level, with tables in the
 * order of Koopman's score statistic and the largest probability over the unknown risks.
 *
 * Takes events and totals of two independent groups; gives ratios, their logarithms found to 1e-10,
 * with lower limit 0 when the index group has no events. A reference without events gives
 * `zeroCell` with the lower limit as `atLeast`, an empty group `emptyGroup`, one of more than 500
 * `tooLarge`.
 *
 * Source: Chan and Zhang (1999) Biometrics 55:1202-1209; Koopman (1984) Biometrics 40:513-517.
 * Example: 7/34 against 1/34 at level 0.95 gives 1.0863 to 180.5.
 */
export const chanZhang = riskRatioMethod(
  {
    id: 'chanZhang',
    label: 'Exact unconditional by the score statistic (two one-sided tests)',
    shortLabel: 'exact unconditional',
    citation:
      'Chan ISF, Zhang Z. Test-based exact confidence intervals for the difference of two ' +
      'binomial proportions. Biometrics 1999;55:1202-1209, with the score statistic of Koopman ' +
      'PAR. Confidence intervals for the ratio of two binomial proportions. ' +
      'Biometrics 1984;40:513-517.',
    effort: 'heavy',
    groupCap: UNCONDITIONAL_CAP.groupCap,
    limits: (table, _z, level) => unconditionalRatioLimits(table, level),
  },
  (table) => issueOfUnconditional(table) ?? issueOfRiskRatio(table),
);
