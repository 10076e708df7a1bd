import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { marginsOf } from '../check-counts';
import type { ContingencyTable } from '../contingency-table';
import { chiSquareUpperTail } from '../distributions';
import type { EstimationIssue, TestOutcome } from '../estimate';
import type { FourfoldTable } from '../fourfold-table';
import { riskDifferenceOf } from '../point-estimates';
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
  return success(outcome((difference * difference * precision) / shares, 1));
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
  if (!table.counts.flat().every((count) => Number.isSafeInteger(count) && count >= 0)) {
    return failure({ code: 'invalidCounts' });
  }
  const rows = table.counts.filter((row) => sum(row) > 0);
  if (rows.length < 2) {
    return failure({ code: 'fewerThanTwoLevels', facts: { levels: rows.length } });
  }
  const columnTotals = (rows[0] ?? []).map((_, column) => sum(rows.map((row) => row[column] ?? 0)));
  const columns = columnTotals.filter((total) => total > 0).length;
  if (columns < 2) {
    return failure({ code: 'emptyMargin', facts: { columns } });
  }
  return success(outcome(statisticOf(rows, columnTotals), (rows.length - 1) * (columns - 1)));
}

function statisticOf(
  rows: readonly (readonly number[])[],
  columnTotals: readonly number[],
): number {
  const total = sum(columnTotals);
  return sum(
    rows.map((row) => {
      const share = sum(row) / total;
      return sum(
        row.map((count, column) => squareOver(count, share * (columnTotals[column] ?? 0))),
      );
    }),
  );
}

function squareOver(observed: number, expected: number): number {
  return expected === 0 ? 0 : ((observed - expected) * (observed - expected)) / expected;
}

function sum(numbers: readonly number[]): number {
  return numbers.reduce((total, number) => total + number, 0);
}

function outcome(statistic: number, degreesOfFreedom: number): TestOutcome {
  return {
    method: 'pearsonChiSquare',
    statistic,
    degreesOfFreedom,
    pValue: chiSquareUpperTail(statistic, degreesOfFreedom),
  };
}
