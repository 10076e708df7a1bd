import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { issueOfGroup } from '../check-counts';
import type { ScoredGroup } from '../contingency-table';
import { chiSquareUpperTail } from '../distributions';
import type { EstimationIssue, TestOutcome } from '../estimate';

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
  return success({
    method: 'cochranArmitage',
    statistic,
    degreesOfFreedom: 1,
    pValue: chiSquareUpperTail(statistic, 1),
  });
}

function issueOfTrend(groups: readonly ScoredGroup[]): EstimationIssue | null {
  const invalid = groups.map((group) => issueOfGroup(group, 'level')).find((issue) => issue);
  if (invalid || !groups.every((group) => Number.isFinite(group.score))) {
    return { code: 'invalidCounts' };
  }
  if (new Set(groups.map((group) => group.score)).size < 2) {
    return { code: 'fewerThanTwoLevels', facts: { levels: groups.length } };
  }
  const events = sumOf(groups, (group) => group.events);
  const others = sumOf(groups, (group) => group.total) - events;
  return events === 0 || others === 0 ? { code: 'emptyMargin', facts: { events, others } } : null;
}

function sumOf(groups: readonly ScoredGroup[], part: (group: ScoredGroup) => number): number {
  return groups.reduce((sum, group) => sum + part(group), 0);
}
