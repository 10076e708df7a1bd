import { success } from '#shared/core';
import type { Result } from '#shared/core';
import { chiSquareOutcome } from '../chi-square-outcome';
import type { ContingencyTable } from '../contingency-table';
import { deviance } from '../distributions';
import type { EstimationIssue, TestOutcome } from '../estimate';
import { occupiedCounts } from './occupied-counts';
import type { OccupiedCounts } from './occupied-counts';

/**
 * Likelihood-ratio test of a table of any size: twice the sum of O log(O/E).
 *
 * Takes counts by row and column; gives the statistic on (rows - 1)(columns - 1) degrees of freedom
 * after empty ones are removed. Fewer than two rows left give `fewerThanTwoLevels`, fewer than two
 * columns `emptyMargin`, counts that are not whole `invalidCounts`. Summed cell by cell as
 * O log(O/E) + E - O, in which nothing cancels near independence.
 *
 * Source: Wilks (1935) Annals of Mathematical Statistics 6:190-196.
 * Example: [[762, 327, 468], [484, 239, 477]] gives 30.017 on 2 degrees of freedom.
 */
export function likelihoodRatioOfTable(
  table: ContingencyTable,
): Result<TestOutcome, EstimationIssue> {
  const counts = occupiedCounts(table);
  return counts.ok ? success(outcomeOf(counts.value)) : counts;
}

function outcomeOf({ rows, rowTotals, columnTotals, total }: OccupiedCounts): TestOutcome {
  const parts = rows.flatMap((row, at) =>
    row.map((count, column) =>
      cellPart(count, ((rowTotals[at] ?? 0) / total) * (columnTotals[column] ?? 0)),
    ),
  );
  const statistic = 2 * parts.reduce((sum, part) => sum + part, 0);
  const degreesOfFreedom = (rowTotals.length - 1) * (columnTotals.length - 1);
  return chiSquareOutcome('likelihoodRatio', statistic, degreesOfFreedom);
}

function cellPart(observed: number, expected: number): number {
  return observed === 0 ? expected : deviance(observed, expected);
}
