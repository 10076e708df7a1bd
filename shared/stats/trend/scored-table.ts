import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import type { ContingencyTable } from '../contingency-table';
import type { EstimationIssue } from '../estimate';

/** A two-way table whose rows and columns have scores; as many as there are of each. */
export interface ScoredTable extends ContingencyTable {
  readonly rowScores: readonly number[];
  readonly columnScores: readonly number[];
}

/** Sums over a scored table around its mean scores. */
export interface ScoredSums {
  readonly total: number;
  readonly rowSquares: number;
  readonly columnSquares: number;
  readonly products: number;
}

/**
 * Sums of squares and products of the scores around their means.
 *
 * Counts that are not whole, scores that are not finite or not as many as rows and columns give
 * `invalidCounts`; one row score only among the counted gives `fewerThanTwoLevels`, one column
 * score `emptyMargin`.
 */
export function scoredSums(table: ScoredTable): Result<ScoredSums, EstimationIssue> {
  if (!isScored(table)) {
    return failure({ code: 'invalidCounts' });
  }
  const { counts, rowScores, columnScores } = table;
  const total = sumOver(table, () => 1);
  const meanRow = sumOver(table, (row) => row) / total;
  const meanColumn = sumOver(table, (_, column) => column) / total;
  if (countedScores(counts, rowScores).size < 2) {
    return failure({ code: 'fewerThanTwoLevels', facts: { levels: counts.length } });
  }
  if (countedScores(turned(counts), columnScores).size < 2) {
    return failure({ code: 'emptyMargin', facts: { columns: columnScores.length } });
  }
  return success({
    total,
    rowSquares: sumOver(table, (row) => (row - meanRow) ** 2),
    columnSquares: sumOver(table, (_, column) => (column - meanColumn) ** 2),
    products: sumOver(table, (row, column) => (row - meanRow) * (column - meanColumn)),
  });
}

function isScored({ counts, rowScores, columnScores }: ScoredTable): boolean {
  const whole = counts.flat().every((count) => Number.isSafeInteger(count) && count >= 0);
  const fits = counts.every((row) => row.length === columnScores.length);
  const finite = [...rowScores, ...columnScores].every((score) => Number.isFinite(score));
  return whole && fits && finite && counts.length === rowScores.length;
}

/** The scores of the lines that hold a count. */
function countedScores(
  lines: readonly (readonly number[])[],
  scores: readonly number[],
): ReadonlySet<number> {
  return new Set(scores.filter((_, at) => lines[at]?.some((count) => count > 0)));
}

function turned(rows: readonly (readonly number[])[]): readonly (readonly number[])[] {
  return (rows[0] ?? []).map((_, column) => rows.map((row) => row[column] ?? 0));
}

function sumOver(
  { counts, rowScores, columnScores }: ScoredTable,
  part: (rowScore: number, columnScore: number) => number,
): number {
  let sum = 0;
  counts.forEach((row, at) => {
    row.forEach((count, column) => {
      sum += count * part(rowScores[at] ?? 0, columnScores[column] ?? 0);
    });
  });
  return sum;
}
