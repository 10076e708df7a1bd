import { success } from '#shared/core';
import type { Result } from '#shared/core';
import { chiSquareOutcome } from '../chi-square-outcome';
import type { EstimationIssue, TestOutcome } from '../estimate';
import { scoredSums } from './scored-table';
import type { ScoredTable } from './scored-table';
import type { TrendTest } from './trend-test';

/**
 * Mantel's linear-by-linear test of a table with scored rows and columns: (N - 1) r².
 *
 * Takes counts with a score for each row and column; gives the chi-square statistic on 1 degree of
 * freedom. Lines without counts are passed over. Counts or scores that do not fit give
 * `invalidCounts`, one row score only `fewerThanTwoLevels`, one column score only `emptyMargin`.
 *
 * Source: Mantel (1963) Journal of the American Statistical Association 58:690-700.
 * Example: events 48, 38, 5, 1, 1 against others 17066, 14464, 788, 126, 37, scored 0, 0.5, 1.5, 4,
 * 7, give 6.5699.
 */
export function linearByLinear(table: ScoredTable): Result<TestOutcome, EstimationIssue> {
  const sums = scoredSums(table);
  if (!sums.ok) {
    return sums;
  }
  const { total, rowSquares, columnSquares, products } = sums.value;
  const statistic = (total - 1) * (products / rowSquares) * (products / columnSquares);
  return success(chiSquareOutcome('linearByLinear', statistic));
}

/** The test for two columns, events and others, as a member of TREND_TESTS. */
export const linearByLinearTest = {
  id: 'linearByLinear',
  label: 'Mantel linear-by-linear test for trend',
  shortLabel: 'linear-by-linear',
  citation:
    'Mantel N. Chi-square tests with one degree of freedom: extensions of the Mantel–Haenszel ' +
    'procedure. Journal of the American Statistical Association 1963;58:690-700.',
  effort: 'light',
  test: (groups) =>
    linearByLinear({
      counts: groups.map(({ events, total }) => [events, total - events]),
      rowScores: groups.map(({ score }) => score),
      columnScores: [1, 0],
    }),
} as const satisfies TrendTest;
