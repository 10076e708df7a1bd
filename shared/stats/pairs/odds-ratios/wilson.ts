import { wilsonLimits } from '../../intervals/risk/wilson';
import { matchedOddsRatioMethod } from './matched-odds-ratio-method';

/**
 * Wilson's limits of a matched odds ratio: the score limits of the share of first-only pairs.
 *
 * Takes the pairs' counts; gives ratios. Issues as every matched odds ratio.
 *
 * Source: as the transformed Wilson interval in Fagerland, Lydersen and Laake (2014) Statistics in
 * Medicine 33:2850-2875.
 * Example: 1 both, 1 only first, 7 only second, 12 neither at level 0.95 give 0.023 to 0.890.
 */
export const wilson = matchedOddsRatioMethod({
  id: 'matchedWilson',
  label: 'Wilson score for a matched odds ratio',
  shortLabel: 'Wilson (pairs)',
  citation:
    'Fagerland MW, Lydersen S, Laake P. Recommended tests and confidence intervals for paired ' +
    'binomial proportions. Statistics in Medicine 2014;33:2850-2875.',
  limitsOfShare: (discordant, z) => wilsonLimits(discordant, z),
});
