import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import type { ScoredGroup } from '../contingency-table';
import type { EstimationIssue, TestOutcome } from '../estimate';
import { exactTrendTails } from './exact-trend-tails';
import { issueOfTrend } from './trend-issue';
import type { TrendTest } from './trend-test';
import { wholeScores } from './whole-scores';

/** More steps than this take longer than a tenth of a second. */
const MOST_STEPS = 40_000_000;

/**
 * Exact test for a linear trend of risks over scored groups, all margins fixed. Two-sided: the
 * probability of score sums at least as far from their expectation as the observed one, on either
 * side; equal distances are found equal by whole numbers.
 *
 * Takes events, total and score of each group, in any order; gives no statistic. Scores must be
 * whole numbers of some unit not below a millionth (`invalidCounts` otherwise). Issues as every
 * test for trend; and `tooLarge` with the `cap` on steps and what to use `instead`: 5 groups scored
 * 1 to 5 with 100 members each and 200 events fit.
 *
 * Source: as the exact conditional linear rank test in Agresti, Mehta and Patel (1990) Journal of
 * the American Statistical Association 85:453-458.
 */
export const exactTrend = {
  id: 'exactTrend',
  label: 'Exact test for trend, two-sided by distance from the expected score sum',
  shortLabel: 'exact trend',
  citation:
    'Agresti A, Mehta CR, Patel NR. Exact inference for contingency tables with ordered ' +
    'categories. Journal of the American Statistical Association 1990;85:453-458.',
  effort: 'heavy',
  test: testOf,
} as const satisfies TrendTest;

function testOf(groups: readonly ScoredGroup[]): Result<TestOutcome, EstimationIssue> {
  const used = groups.filter((group) => group.total !== 0);
  const issue = issueOfTrend(used);
  if (issue) {
    return failure(issue);
  }
  const scores = wholeScores(used.map(({ score }) => score));
  if (scores === null) {
    return failure({ code: 'invalidCounts' });
  }
  const whole = used.map((group, at) => ({ ...group, score: scores[at] ?? 0 }));
  const pValue = exactTrendTails(whole, MOST_STEPS);
  return pValue === null
    ? failure({ code: 'tooLarge', facts: { cap: MOST_STEPS, instead: 'cochranArmitage' } })
    : success({ method: 'exactTrend', statistic: null, degreesOfFreedom: null, pValue });
}
