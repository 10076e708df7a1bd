import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import type { ContingencyTable } from '../../contingency-table';
import type { EstimationIssue, TestOutcome } from '../../estimate';
import { occupiedCounts } from '../occupied-counts';
import type { OccupiedCounts } from '../occupied-counts';
import { mostTables } from './number-of-tables';
import { tailOfTables } from './tail-of-tables';

/** More counted records than this would blur ties beyond 1e-7 of a probability. */
const MOST_RECORDS = 1500;
/** With more tables of the same margins than this, the search is not begun. */
const MOST_TABLES = 1e15;
/** With more partial tables than this, the search is given up: one to two seconds. */
const MOST_PARTIAL_TABLES = 2_000_000;

/**
 * Fisher's exact test of a table of any size, after Freeman and Halton: the probability, with all
 * margins fixed, of tables no likelier than the one observed. Equal probabilities are found equal
 * by whole numbers; others count as tied up to 1e-7 of them.
 *
 * Takes counts by row and column; empty ones are removed first. Gives no statistic. Issues as
 * `likelihoodRatioOfTable`; and `tooLarge` with the `cap`, what it is of (`records`, `tables` with
 * the same margins, `partialTables` looked at) and what to use `instead`: 4 × 4 tables of 100
 * records fit, 6 × 2 tables of 1000 do not. It may take a second before it is given up, so that it
 * is work for the side, not for a screen's own thread.
 *
 * Source: Freeman and Halton (1951) Biometrika 38:141-149; the search by columns after Mehta and
 * Patel (1983) Journal of the American Statistical Association 78:427-434.
 * Example: [[1, 3, 10, 6], [2, 3, 10, 7], [1, 6, 14, 12], [0, 1, 9, 11]] gives p = 0.7827.
 */
export function fisherOfTable(table: ContingencyTable): Result<TestOutcome, EstimationIssue> {
  const occupied = occupiedCounts(table);
  if (!occupied.ok) {
    return occupied;
  }
  const counts = withFewerRows(occupied.value);
  if (counts.total > MOST_RECORDS) {
    return tooLarge(MOST_RECORDS, 'records');
  }
  if (mostTables(counts.rowTotals, counts.columnTotals) > MOST_TABLES) {
    return tooLarge(MOST_TABLES, 'tables');
  }
  const pValue = tailOfTables(counts, MOST_PARTIAL_TABLES);
  return pValue === null
    ? tooLarge(MOST_PARTIAL_TABLES, 'partialTables')
    : success({ method: 'fisherFreemanHalton', statistic: null, degreesOfFreedom: null, pValue });
}

function tooLarge(cap: number, of: string): Result<never, EstimationIssue> {
  return failure({ code: 'tooLarge', facts: { cap, of, instead: 'pearsonChiSquare' } });
}

/** The table on its shorter side: fewer row totals have to be kept apart. */
function withFewerRows(counts: OccupiedCounts): OccupiedCounts {
  const { rows, rowTotals, columnTotals, total } = counts;
  if (rowTotals.length <= columnTotals.length) {
    return counts;
  }
  const turned = columnTotals.map((_, column) => rows.map((row) => row[column] ?? 0));
  return { rows: turned, rowTotals: columnTotals, columnTotals: rowTotals, total };
}
