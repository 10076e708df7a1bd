import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import type { ContingencyTable } from '../contingency-table';
import type { EstimationIssue } from '../estimate';

/** A table of counts without empty rows and columns, with its totals. */
export interface OccupiedCounts {
  readonly rows: readonly (readonly number[])[];
  readonly rowTotals: readonly number[];
  readonly columnTotals: readonly number[];
  readonly total: number;
}

/**
 * Removes rows and columns without counts: they tell nothing.
 *
 * Fewer than two rows left give `fewerThanTwoLevels`, fewer than two columns `emptyMargin`, counts
 * that are not whole or rows of unequal length `invalidCounts`.
 */
export function occupiedCounts(table: ContingencyTable): Result<OccupiedCounts, EstimationIssue> {
  if (!isWhole(table)) {
    return failure({ code: 'invalidCounts' });
  }
  const filled = table.counts.filter((row) => sumOf(row) > 0);
  const kept = (filled[0] ?? []).map((_, column) => filled.some((row) => (row[column] ?? 0) > 0));
  const rows = filled.map((row) => row.filter((_, column) => kept[column]));
  const columns = kept.filter(Boolean).length;
  if (rows.length < 2) {
    return failure({ code: 'fewerThanTwoLevels', facts: { levels: rows.length } });
  }
  return columns < 2 ? failure({ code: 'emptyMargin', facts: { columns } }) : success(totals(rows));
}

function isWhole({ counts }: ContingencyTable): boolean {
  const width = counts[0]?.length ?? 0;
  return counts.every(
    (row) =>
      row.length === width && row.every((count) => Number.isSafeInteger(count) && count >= 0),
  );
}

function totals(rows: readonly (readonly number[])[]): OccupiedCounts {
  const rowTotals = rows.map(sumOf);
  const columnTotals = (rows[0] ?? []).map((_, column) =>
    sumOf(rows.map((row) => row[column] ?? 0)),
  );
  return { rows, rowTotals, columnTotals, total: sumOf(rowTotals) };
}

function sumOf(numbers: readonly number[]): number {
  return numbers.reduce((sum, number) => sum + number, 0);
}
