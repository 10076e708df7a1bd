import { success } from '#shared/core';
import type { OddsRatioFit } from '../../fitted-odds-ratio';
import { issueOfTest } from '../../tests-of-association/fourfold-issue';
import { breslowDayStatistic, fitsAtCommonRatio } from './fits-at-common-ratio';
import { homogeneityMethod } from './homogeneity-method';

/**
 * Whether the odds ratio is the same in all strata: Breslow and Day's test around the
 * Mantel–Haenszel estimate, with Tarone's correction.
 *
 * Takes events and totals by stratum; gives a chi-square statistic with one degree of freedom less
 * than informative strata. Fewer than two of them: `fewerThanTwoStrata`; a pooled estimate of 0 or
 * infinity: `zeroCell`.
 *
 * Source: Breslow and Day (1980) Statistical Methods in Cancer Research I; Tarone (1985) Biometrika
 * 72:91-95.
 * Example: the admissions data give 18.8255 on 5 degrees of freedom.
 */
export const breslowDayTarone = homogeneityMethod({
  id: 'breslowDayTarone',
  label: "Breslow–Day test of homogeneity with Tarone's correction",
  shortLabel: 'Breslow–Day–Tarone',
  citation:
    'Tarone RE. On heterogeneity tests based on efficient scores. Biometrika 1985;72:91-95.',
  issueOfStratum: issueOfTest,
  statistic(used) {
    const fits = fitsAtCommonRatio(used);
    return fits.ok ? success(breslowDayStatistic(fits.value) - correction(fits.value)) : fits;
  },
});

/** What the statistic gains because the common ratio is not the maximum likelihood one. */
function correction(fits: readonly OddsRatioFit[]): number {
  const deviation = fits.reduce((sum, fit) => sum + fit.deviation, 0);
  const variance = fits.reduce((sum, fit) => sum + fit.variance, 0);
  return deviation ** 2 / variance;
}
