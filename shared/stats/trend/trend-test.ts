import type { Result } from '#shared/core';
import type { ScoredGroup } from '../contingency-table';
import type { EstimationIssue, TestOutcome } from '../estimate';
import type { MethodEffort } from '../method-effort';
import type { MethodWords } from '../intervals/interval-method';

/**
 * A test for a trend of risks over scored groups; a member of TREND_TESTS.
 *
 * `test` takes events, total and score of each group, in any order. Groups without members are
 * passed over. Fewer than two groups with different scores give `fewerThanTwoLevels`; events in
 * nobody or in everybody give `emptyMargin`.
 */
export interface TrendTest extends MethodWords {
  readonly effort: MethodEffort;
  test(groups: readonly ScoredGroup[]): Result<TestOutcome, EstimationIssue>;
}
