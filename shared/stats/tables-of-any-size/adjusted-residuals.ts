import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import type { ContingencyTable } from '../contingency-table';
import type { EstimationIssue } from '../estimate';
import { occupiedCounts } from './occupied-counts';

/**
 * Adjusted residuals of a table: how many standard errors each count lies from what independence
 * of rows and columns leads to expect.
 *
 * Takes counts by row and column; gives numbers in the same places, about standard normal under
 * independence, null in empty rows and columns. Issues as `likelihoodRatioOfTable`.
 *
 * Source: Haberman (1973) Biometrics 29:205-220.
 * Example: [[762, 327, 468], [484, 239, 477]] gives 4.5021 for the first count.
 */
export function adjustedResiduals(
  table: ContingencyTable,
): Result<readonly (readonly (number | null)[])[], EstimationIssue> {
  const occupied = occupiedCounts(table);
  if (!occupied.ok) {
    return failure(occupied.issue);
  }
  const { counts } = table;
  const { total } = occupied.value;
  const rowShares = counts.map((row) => sumOf(row) / total);
  const columnShares = (counts[0] ?? []).map(
    (_, column) => sumOf(counts.map((row) => row[column] ?? 0)) / total,
  );
  return success(
    counts.map((row, at) =>
      row.map((count, column) =>
        residual(count, rowShares[at] ?? 0, columnShares[column] ?? 0, total),
      ),
    ),
  );
}

function residual(count: number, row: number, column: number, total: number): number | null {
  const expected = row * column * total;
  return expected === 0
    ? null
    : (count - expected) / Math.sqrt(expected * (1 - row) * (1 - column));
}

function sumOf(numbers: readonly number[]): number {
  return numbers.reduce((sum, number) => sum + number, 0);
}
