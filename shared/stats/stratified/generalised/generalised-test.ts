import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { chiSquareOutcome } from '../../chi-square-outcome';
import type { ContingencyTable } from '../../contingency-table';
import type { EstimationIssue, TestOutcome } from '../../estimate';
import { quadraticForm } from './quadratic-form';

/** The two-way table of one stratum. */
export interface ContingencyStratum {
  readonly id: string;
  readonly table: ContingencyTable;
}

/** Two-way tables by stratum, all with the same rows and columns. */
export type StratifiedContingency = readonly ContingencyStratum[];

/** One weighted sum of a table's counts: each weighs its row's times its column's number. */
export interface Contrast {
  readonly rows: readonly number[];
  readonly columns: readonly number[];
}

/**
 * Tests contrasts of the counts against their expectations, summed over strata, all margins of all
 * strata fixed: a chi-square statistic with as many degrees of freedom as independent contrasts.
 *
 * Counts that are not whole and tables that differ in shape give `invalidCounts`; strata that fix
 * all their counts tell nothing, and when there are only such: `noInformativeStratum`.
 */
export function testContrasts(
  strata: StratifiedContingency,
  contrasts: readonly Contrast[],
  method: string,
): Result<TestOutcome, EstimationIssue> {
  const issue = issueOfShape(strata, contrasts);
  if (issue) {
    return failure(issue);
  }
  const moments = strata.flatMap(({ table }) => momentsOf(table, contrasts));
  const { value, rank } = quadraticForm(
    contrasts.map((_, at) => sumOf(moments.map(({ deviations }) => deviations[at] ?? 0))),
    contrasts.map((_, at) =>
      contrasts.map((__, other) => sumOf(moments.map(({ spread }) => spread[at]?.[other] ?? 0))),
    ),
  );
  return rank === 0
    ? failure({ code: 'noInformativeStratum', facts: { strata: strata.length } })
    : success(chiSquareOutcome(method, value, rank));
}

function issueOfShape(
  strata: StratifiedContingency,
  contrasts: readonly Contrast[],
): EstimationIssue | null {
  const [first] = contrasts;
  const fits = strata.every(
    ({ table }) =>
      table.counts.length === first?.rows.length &&
      table.counts.every((row) => row.length === first.columns.length),
  );
  const counts = strata.flatMap(({ table }) => table.counts.flat());
  const whole = counts.every((count) => Number.isSafeInteger(count) && count >= 0);
  const weights = contrasts.flatMap(({ rows, columns }) => [...rows, ...columns]);
  const finite = weights.every((weight) => Number.isFinite(weight));
  return fits && whole && finite ? null : { code: 'invalidCounts' };
}

/** A stratum's part in the contrasts: observed less expected, and their covariances. */
interface Moments {
  readonly deviations: readonly number[];
  readonly spread: readonly (readonly number[])[];
}

/** None where there is but one member: nothing varies. */
function momentsOf({ counts }: ContingencyTable, contrasts: readonly Contrast[]): Moments[] {
  const rowTotals = counts.map(sumOf);
  const columnTotals = (counts[0] ?? []).map((_, at) => sumOf(counts.map((row) => row[at] ?? 0)));
  const total = sumOf(rowTotals);
  if (total < 2) {
    return [];
  }
  const rowParts = contrasts.map(({ rows }) => centred(rows, rowTotals, total));
  const columnParts = contrasts.map(({ columns }) => centred(columns, columnTotals, total));
  return [
    {
      deviations: contrasts.map((_, at) =>
        weighed(counts, rowParts[at] ?? [], columnParts[at] ?? []),
      ),
      spread: contrasts.map((_, at) =>
        contrasts.map(
          (__, other) =>
            (productSum(rowTotals, rowParts[at], rowParts[other]) *
              productSum(columnTotals, columnParts[at], columnParts[other])) /
            (total - 1),
        ),
      ),
    },
  ];
}

/** Weights less their mean over the stratum's members: the expected sum is then 0. */
function centred(
  weights: readonly number[],
  totals: readonly number[],
  total: number,
): readonly number[] {
  const mean = sumOf(weights.map((weight, at) => weight * (totals[at] ?? 0))) / total;
  return weights.map((weight) => weight - mean);
}

function weighed(
  counts: readonly (readonly number[])[],
  rows: readonly number[],
  columns: readonly number[],
): number {
  return sumOf(
    counts.map(
      (row, at) =>
        (rows[at] ?? 0) * sumOf(row.map((count, place) => count * (columns[place] ?? 0))),
    ),
  );
}

function productSum(
  totals: readonly number[],
  one: readonly number[] = [],
  other: readonly number[] = [],
): number {
  return sumOf(totals.map((total, at) => total * (one[at] ?? 0) * (other[at] ?? 0)));
}

function sumOf(numbers: readonly number[]): number {
  return numbers.reduce((sum, number) => sum + number, 0);
}
