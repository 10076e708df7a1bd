import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { chiSquareOutcome } from '../chi-square-outcome';
import type { ScoredGroup } from '../contingency-table';
import type { EstimationIssue, TestOutcome } from '../estimate';
import { issueOfTrend, sumOf } from './trend-issue';
import type { TrendTest } from './trend-test';

/**
 * Cochran and Armitage's test for a linear trend of risks over scored groups.
 *
 * Takes events, total and score of each group, in any order; gives the chi-square statistic on 1
 * degree of freedom. Groups without members are passed over. Fewer than two groups with different
 * scores give `fewerThanTwoLevels`; events in nobody or in everybody give `emptyMargin`.
 *
 * Source: Cochran (1954) Biometrics 10:417-451; Armitage (1955) Biometrics 11:375-386.
 * Example: 83/86, 90/93, 129/136, 70/82 scored 1 to 4 give 8.2249, p = 0.0041.
 */
export function cochranArmitage(
  groups: readonly ScoredGroup[],
): Result<TestOutcome, EstimationIssue> {
  const used = groups.filter((group) => group.total !== 0);
  const issue = issueOfTrend(used);
  if (issue) {
    return failure(issue);
  }
  const total = sumOf(used, (group) => group.total);
  const share = sumOf(used, (group) => group.events) / total;
  const centre = sumOf(used, (group) => group.total * group.score) / total;
  const trend = sumOf(
    used,
    (group) => (group.events - share * group.total) * (group.score - centre),
  );
  const spread = sumOf(used, (group) => group.total * (group.score - centre) ** 2);
  const statistic = (trend * trend) / (share * (1 - share) * spread);
  return success(chiSquareOutcome('cochranArmitage', statistic));
}

/** The test as a member of TREND_TESTS. */
export const cochranArmitageTest = {
  id: 'cochranArmitage',
  label: 'Cochran–Armitage test for trend',
  shortLabel: 'Cochran–Armitage',
  citation:
    'Armitage P. Tests for linear trends in proportions and frequencies. ' +
    'Biometrics 1955;11:375-386.',
  effort: 'light',
  test: cochranArmitage,
} as const satisfies TrendTest;
