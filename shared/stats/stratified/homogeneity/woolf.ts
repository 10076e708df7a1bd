import { success } from '#shared/core';
import { issueOfLogOddsRatio } from '../../intervals/odds-ratio/odds-ratio-method';
import { oddsRatioOf } from '../../point-estimates';
import { varianceOfLogOddsRatio } from '../../variances';
import { homogeneityMethod } from './homogeneity-method';
import { inverseVarianceQ } from './inverse-variance';

/**
 * Whether the odds ratio is the same in all strata: Woolf's test, Q of its logarithm around the
 * inverse-variance mean.
 *
 * Nothing is added to cells: a stratum with a zero cell (`zeroCell`) is left out and named, as is
 * one with an empty group. Fewer than two others: `fewerThanTwoStrata`.
 *
 * Source: Woolf (1955) Annals of Human Genetics 19:251-253.
 * Example: 19/52 v 4/44, 6/10 v 5/16, 5/12 v 20/55 give 3.0166 on 2 degrees of freedom.
 */
export const woolf = homogeneityMethod({
  id: 'woolf',
  label: "Woolf's test of homogeneity",
  shortLabel: "Woolf's test",
  citation:
    'Woolf B. On estimating the relation between blood group and disease. ' +
    'Annals of Human Genetics 1955;19:251-253.',
  issueOfStratum: issueOfLogOddsRatio,
  statistic: (used) =>
    success(
      inverseVarianceQ(used, (table) => Math.log(oddsRatioOf(table)), varianceOfLogOddsRatio),
    ),
});
