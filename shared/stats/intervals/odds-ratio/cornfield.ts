import { oddsRatioOf } from '../../point-estimates';
import { oddsRatioScore } from '../score/odds-ratio-score';
import { limitsOfRatio } from '../score/score-limits';
import { oddsRatioMethod } from './odds-ratio-method';

/**
 * Cornfield's score interval for an odds ratio, index over reference, without continuity
 * correction.
 *
 * Takes events and totals of two independent groups; gives ratios, with lower limit 0 when the
 * estimate is 0. A zero cell that makes the estimate infinite gives `zeroCell` with the lower limit
 * as `atLeast`, an empty group `emptyGroup`.
 *
 * Source: Cornfield (1956) Proceedings of the Third Berkeley Symposium 4:135-148.
 * Example: 28/51 against 71/230 at level 0.95 gives 1.476 to 5.035.
 */
export const cornfield = oddsRatioMethod({
  id: 'cornfield',
  label: 'Cornfield score',
  shortLabel: 'Cornfield',
  citation:
    'Cornfield J. A statistical problem arising from retrospective studies. Proceedings of the ' +
    'Third Berkeley Symposium on Mathematical Statistics and Probability 1956;4:135-148.',
  limits(table, z) {
    return limitsOfRatio(oddsRatioOf(table), oddsRatioScore(table, 1), z);
  },
});
