import { issueOfGroup } from '../check-counts';
import type { ScoredGroup } from '../contingency-table';
import type { EstimationIssue } from '../estimate';

/** Why scored groups, all with members, give no test for trend, or null. */
export function issueOfTrend(groups: readonly ScoredGroup[]): EstimationIssue | null {
  const invalid = groups.some((group) => issueOfGroup(group, 'level') !== null);
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

/** Sum of a number over groups. */
export function sumOf(
  groups: readonly ScoredGroup[],
  part: (group: ScoredGroup) => number,
): number {
  return groups.reduce((sum, group) => sum + part(group), 0);
}
