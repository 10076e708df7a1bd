import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { chiSquareOutcome } from '../chi-square-outcome';
import { marginsOf } from '../check-counts';
import type { ContingencyTable } from '../contingency-table';
import type { EstimationIssue, TestOutcome } from '../estimate';
import type { FourfoldTable } from '../fourfold-table';
import { riskDifferenceOf } from '../point-estimates';
import { occupiedCounts } from '../tables-of-any-size/occupied-counts';
import type { OccupiedCounts } from '../tables-of-any-size/occupied-counts';
import { issueOfTest } from './fourfold-issue';

/**
 * Pearson's chi-square test of a fourfold table, without continuity correction.
 *
 * Takes events and totals of two groups; gives the statistic on 1 degree of freedom. An empty
 * group gives `emptyGroup`; events in nobody or in everybody give `emptyMargin`.
 *
 * Source: Pearson (1900) Philosophical Magazine 50:157-175.
 * Example: 3/4 against 1/4 gives 2.000, p = 0.1573.
 */
export function pearsonOfFourfold(table: FourfoldTable): Result<TestOutcome, EstimationIssue> {
  const issue = issueOfTest(table);
  if (issue) {
    return failure(issue);
  }
  const { events, others, total } = marginsOf(table);
  const difference = riskDifferenceOf(table);
  const shares = (events / total) * (others / total);
  const precision = (table.index.total / total) * table.reference.total;
  return success(
    chiSquareOutcome('pearsonChiSquare', (difference * difference * precision) / shares, 1),
  );
}

/**
 * Pearson's chi-square test of a table of any size, without continuity correction.
 *
 * Rows and columns without counts are removed first. Fewer than two rows left give
 * `fewerThanTwoLevels`, fewer than two columns `emptyMargin`, counts that are not whole
 * `invalidCounts`.
 *
 * Source: Pearson (1900) Philosophical Magazine 50:157-175.
 * Example: [[762, 327, 468], [484, 239, 477]] gives 30.070 on 2 degrees of freedom.
 */
export function pearsonOfTable(table: ContingencyTable): Result<TestOutcome, EstimationIssue> {
  const occupied = occupiedCounts(table);
  if (!occupied.ok) {
    return occupied;
  }
  const { rowTotals, columnTotals } = occupied.value;
  const degreesOfFreedom = (rowTotals.length - 1) * (columnTotals.length - 1);
  return success(
    chiSquareOutcome('pearsonChiSquare', statisticOf(occupied.value), degreesOfFreedom),
  );
}

function statisticOf({ rows, rowTotals, columnTotals, total }: OccupiedCounts): number {
  const parts = rows.flatMap((row, at) => {
    const share = (rowTotals[at] ?? 0) / total;
    return row.map((count, column) => squareOver(count, share * (columnTotals[column] ?? 0)));
  });
  return parts.reduce((sum, part) => sum + part, 0);
}

function squareOver(observed: number, expected: number): number {
  return ((observed - expected) * (observed - expected)) / expected;
}
