import { binomialCumulative, binomialProbability } from '../../distributions';
import type { GroupCount } from '../../fourfold-table';
import type { Limits } from '../../intervals/interval-method';
import { zeroOfDecreasing } from '../../intervals/score/bisection';
import { matchedOddsRatioMethod } from './matched-odds-ratio-method';

/**
 * Mid-p limits of a matched odds ratio: as the exact ones, but half of the observed probability
 * counts towards a tail.
 *
 * Takes the pairs' counts; gives ratios. Issues as every matched odds ratio.
 *
 * Source: as the transformed mid-p interval in Fagerland, Lydersen and Laake (2014) Statistics in
 * Medicine 33:2850-2875.
 * Example: 1 both, 1 only first, 7 only second, 12 neither at level 0.95 give 0.006 to 0.924.
 */
export const midP = matchedOddsRatioMethod({
  id: 'matchedMidP',
  label: 'Mid-p for a matched odds ratio',
  shortLabel: 'mid-p (pairs)',
  citation:
    'Fagerland MW, Lydersen S, Laake P. Recommended tests and confidence intervals for paired ' +
    'binomial proportions. Statistics in Medicine 2014;33:2850-2875.',
  limitsOfShare: (discordant, _z, level) => midPLimits(discordant, (1 - level) / 2),
});

function midPLimits({ events, total }: GroupCount, tail: number): Limits {
  const below = (share: number): number =>
    binomialCumulative(events, total, share) - binomialProbability(events, total, share) / 2;
  const lower = zeroOfDecreasing((share) => below(share) - (1 - tail), 0, 1);
  const upper = zeroOfDecreasing((share) => below(share) - tail, 0, 1);
  return [events === 0 ? 0 : lower, events === total ? 1 : upper];
}
