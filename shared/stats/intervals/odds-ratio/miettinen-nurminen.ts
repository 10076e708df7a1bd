import { oddsRatioOf } from '../../point-estimates';
import { MIETTINEN_NURMINEN } from '../miettinen-nurminen-words';
import { oddsRatioScore } from '../score/odds-ratio-score';
import { limitsOfRatio } from '../score/score-limits';
import { inflation } from '../score/standardised';
import { oddsRatioMethod } from './odds-ratio-method';

/**
 * Miettinen and Nurminen's score interval for an odds ratio, index over reference, with the factor
 * N / (N - 1) in the variance.
 *
 * Takes events and totals of two independent groups; gives ratios, with lower limit 0 when the
 * estimate is 0. A zero cell that makes the estimate infinite gives `zeroCell` with the lower limit
 * as `atLeast`, an empty group `emptyGroup`.
 *
 * Source: Miettinen and Nurminen (1985) Statistics in Medicine 4:213-226.
 * Example: 9/13 against 4/14 at level 0.95 gives 1.0934 to 28.9419.
 */
export const miettinenNurminen = oddsRatioMethod({
  ...MIETTINEN_NURMINEN,
  limits(table, z) {
    return limitsOfRatio(oddsRatioOf(table), oddsRatioScore(table, inflation(table)), z);
  },
});
