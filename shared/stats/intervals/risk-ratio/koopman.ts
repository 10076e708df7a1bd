import { riskRatioOf } from '../../point-estimates';
import { riskRatioScore } from '../score/risk-ratio-score';
import { limitsOfRatio } from '../score/score-limits';
import { riskRatioMethod } from './risk-ratio-method';

/**
 * Koopman's score interval for a risk ratio, index over reference.
 *
 * Takes events and totals of two independent groups; gives ratios, with lower limit 0 when the
 * index group has no events. A reference without events gives `zeroCell` with the lower limit as
 * `atLeast`, an empty group `emptyGroup`.
 *
 * Source: Koopman (1984) Biometrics 40:513-517.
 * Example: 36/40 against 16/80 at level 0.95 gives 2.940 to 7.152.
 */
export const koopman = riskRatioMethod({
  id: 'koopman',
  label: 'Koopman score',
  shortLabel: 'Koopman',
  citation:
    'Koopman PAR. Confidence intervals for the ratio of two binomial proportions. ' +
    'Biometrics 1984;40:513-517.',
  limits(table, z) {
    return limitsOfRatio(riskRatioOf(table), riskRatioScore(table, 1), z);
  },
});
