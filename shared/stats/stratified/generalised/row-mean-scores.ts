import type { Result } from '#shared/core';
import type { EstimationIssue, TestOutcome } from '../../estimate';
import { shapeOf, units } from './general-association';
import type { StratifiedContingency } from './generalised-test';
import { testContrasts } from './generalised-test';

/**
 * Generalised Cochran–Mantel–Haenszel test of whether the rows' mean column scores differ, rows
 * being names and columns ordered.
 *
 * Takes two-way tables by stratum and a score for each column; gives a chi-square statistic on
 * rows - 1 degrees of freedom, fewer where rows are empty throughout. Issues as
 * `generalAssociation`.
 *
 * Source: Landis, Heyman and Koch (1978) International Statistical Review 46:237-254.
 */
export function rowMeanScores(
  strata: StratifiedContingency,
  columnScores: readonly number[],
): Result<TestOutcome, EstimationIssue> {
  const contrasts = units(shapeOf(strata).rows).map((rows) => ({ rows, columns: columnScores }));
  return testContrasts(strata, contrasts, 'rowMeanScores');
}
