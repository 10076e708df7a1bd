import { success } from '#shared/core';
import { issueOfTest } from '../../tests-of-association/fourfold-issue';
import { breslowDayStatistic, fitsAtCommonRatio } from './fits-at-common-ratio';
import { homogeneityMethod } from './homogeneity-method';

/**
 * Whether the odds ratio is the same in all strata: Breslow and Day's test around the
 * Mantel–Haenszel estimate, without Tarone's correction.
 *
 * Takes events and totals by stratum; gives a chi-square statistic with one degree of freedom less
 * than informative strata. Fewer than two of them: `fewerThanTwoStrata`; a pooled estimate of 0 or
 * infinity: `zeroCell`.
 *
 * Source: Breslow and Day (1980) Statistical Methods in Cancer Research I.
 * Example: the admissions data give 18.8255 on 5 degrees of freedom.
 */
export const breslowDay = homogeneityMethod({
  id: 'breslowDay',
  label: 'Breslow–Day test of homogeneity',
  shortLabel: 'Breslow–Day',
  citation:
    'Breslow NE, Day NE. Statistical methods in cancer research. Volume I: the analysis of ' +
    'case-control studies. Lyon: International Agency for Research on Cancer; 1980.',
  issueOfStratum: issueOfTest,
  statistic(used) {
    const fits = fitsAtCommonRatio(used);
    return fits.ok ? success(breslowDayStatistic(fits.value)) : fits;
  },
});
