import type { Result } from '#shared/core';
import type { EstimationIssue, TestOutcome } from '../../estimate';
import type { StratifiedContingency } from './generalised-test';
import { testContrasts } from './generalised-test';

/** The scores of an ordered table's rows and columns. */
export interface TableScores {
  readonly rowScores: readonly number[];
  readonly columnScores: readonly number[];
}

/**
 * Generalised Cochran–Mantel–Haenszel test of correlation, rows and columns being ordered.
 *
 * Takes two-way tables by stratum and a score for each row and column; gives a chi-square statistic
 * on 1 degree of freedom. Issues as `generalAssociation`.
 *
 * Source: Mantel (1963) Journal of the American Statistical Association 58:690-700; Landis, Heyman
 * and Koch (1978) International Statistical Review 46:237-254.
 * Example: one table gives (N - 1) r².
 */
export function scoreCorrelation(
  strata: StratifiedContingency,
  { rowScores, columnScores }: TableScores,
): Result<TestOutcome, EstimationIssue> {
  const contrasts = [{ rows: rowScores, columns: columnScores }];
  return testContrasts(strata, contrasts, 'scoreCorrelation');
}
