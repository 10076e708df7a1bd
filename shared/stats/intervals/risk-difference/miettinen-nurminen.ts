import { MIETTINEN_NURMINEN } from '../miettinen-nurminen-words';
import { riskDifferenceScore } from '../score/risk-difference-score';
import { limitsOfDifference } from '../score/score-limits';
import { riskDifferenceMethod } from './risk-difference-method';

/**
 * Miettinen and Nurminen's score interval for a risk difference, index minus reference, with the
 * factor N / (N - 1) in the variance.
 *
 * Takes events and totals of two independent groups; gives proportions in [-1, 1]. Defined for
 * zero and full cells; an empty group gives the issue `emptyGroup`.
 *
 * Source: Miettinen and Nurminen (1985) Statistics in Medicine 4:213-226.
 * Example: 56/70 against 48/80 at level 0.95 gives 0.0528 to 0.3382.
 */
export const miettinenNurminen = riskDifferenceMethod({
  ...MIETTINEN_NURMINEN,
  limits(table, z) {
    return limitsOfDifference(table, riskDifferenceScore(table), z);
  },
});
