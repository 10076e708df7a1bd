import { clopperPearsonLimits } from '../../intervals/risk/clopper-pearson';
import { matchedOddsRatioMethod } from './matched-odds-ratio-method';

/**
 * Exact limits of a matched odds ratio: Clopper and Pearson's of the share of first-only pairs.
 *
 * Takes the pairs' counts; gives ratios. Issues as every matched odds ratio.
 *
 * Source: as the transformed Clopper–Pearson interval in Fagerland, Lydersen and Laake (2014)
 * Statistics in Medicine 33:2850-2875.
 * Example: 1 both, 1 only first, 7 only second, 12 neither at level 0.95 give 0.003 to 1.112.
 */
export const exact = matchedOddsRatioMethod({
  id: 'matchedExact',
  label: 'Exact for a matched odds ratio',
  shortLabel: 'exact (pairs)',
  citation:
    'Fagerland MW, Lydersen S, Laake P. Recommended tests and confidence intervals for paired ' +
    'binomial proportions. Statistics in Medicine 2014;33:2850-2875.',
  limitsOfShare: (discordant, _z, level) => clopperPearsonLimits(discordant, level),
});
