import type { Result } from '#shared/core';
import type { EstimationIssue, TestOutcome } from '../../estimate';
import type { FourfoldTable } from '../../fourfold-table';
import type { MethodWords } from '../../intervals';
import type { MethodEffort } from '../../method-effort';

/**
 * A test of no association in a fourfold table, a member of FOURFOLD_TESTS.
 *
 * `test` takes events and totals of two independent groups and gives a two-sided p-value; an empty
 * group gives `emptyGroup`, events in nobody or in everybody `emptyMargin`, a group beyond the cap
 * `tooLarge`.
 */
export interface FourfoldTest extends MethodWords {
  readonly effort: MethodEffort;
  /** The largest group that the test accepts; null where any size will do. */
  readonly groupCap: number | null;
  test(table: FourfoldTable): Result<TestOutcome, EstimationIssue>;
}
