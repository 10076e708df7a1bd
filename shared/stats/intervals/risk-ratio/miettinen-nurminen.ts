import { riskRatioOf } from '../../point-estimates';
import { MIETTINEN_NURMINEN } from '../miettinen-nurminen-words';
import { riskRatioScore } from '../score/risk-ratio-score';
import { limitsOfRatio } from '../score/score-limits';
import { inflation } from '../score/standardised';
import { riskRatioMethod } from './risk-ratio-method';

/**
 * Miettinen and Nurminen's score interval for a risk ratio, index over reference: Koopman's with
 * the factor N / (N - 1) in the variance.
 *
 * Takes events and totals of two independent groups; gives ratios, with lower limit 0 when the
 * index group has no events. A reference without events gives `zeroCell` with the lower limit as
 * `atLeast`, an empty group `emptyGroup`.
 *
 * Source: Miettinen and Nurminen (1985) Statistics in Medicine 4:213-226.
 * Example: 7/34 against 1/34 at level 0.95 gives 1.2086 to 43.0330.
 */
export const miettinenNurminen = riskRatioMethod({
  ...MIETTINEN_NURMINEN,
  limits(table, z) {
    return limitsOfRatio(riskRatioOf(table), riskRatioScore(table, inflation(table)), z);
  },
});
