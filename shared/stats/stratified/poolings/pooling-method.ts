import type { Result } from '#shared/core';
import type { Estimate, EstimationIssue } from '../../estimate';
import type { FourfoldTable, StratifiedTable } from '../../fourfold-table';
import type { MethodWords } from '../../intervals/interval-method';

/**
 * A way to pool one measure over strata, with limits; a member of one of the registers.
 *
 * `pooled` takes events and totals by stratum and a level (0.95); gives the issue that says why the
 * method is not defined for these counts. Strata with an `issueOfStratum` are not used.
 */
export interface PoolingMethod extends MethodWords {
  /** Why a stratum tells nothing about the pooled estimate, or null. */
  issueOfStratum(table: FourfoldTable): EstimationIssue | null;
  pooled(strata: StratifiedTable, level: number): Result<Estimate, EstimationIssue>;
}
