import type { DecimalMark } from '#shared/code-book';
import type { MarkVotes } from './number-totals';

/**
 * The decimal mark of a file: the one that more distinct values can only be read with.
 *
 * Values such as "1,234" may group thousands, so they speak for the comma only where nothing else
 * does and semicolons separate the columns, as files with decimal commas have it.
 */
export function decimalMarkOf(
  columns: readonly MarkVotes[],
  delimiter: string | null,
): DecimalMark {
  const votes = sumOfVotes(columns);
  if (votes.comma !== votes.point) return votes.comma > votes.point ? ',' : '.';
  return delimiter === ';' && votes.groupedComma > votes.groupedPoint ? ',' : '.';
}

/** The votes of all columns together. */
export function sumOfVotes(columns: readonly MarkVotes[]): MarkVotes {
  const sum = (key: keyof MarkVotes): number =>
    columns.reduce((total, votes) => total + votes[key], 0);
  return {
    point: sum('point'),
    comma: sum('comma'),
    groupedComma: sum('groupedComma'),
    groupedPoint: sum('groupedPoint'),
  };
}
