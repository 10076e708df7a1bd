import type { ColumnKind } from './code-book';
import { orderCodes } from './level-order';
import { missingReasonOf } from './missing-words';
import type { ColumnContents } from './profile';

/** More distinct values than this are no category without a person saying so. */
export const MOST_LIKELY_LEVELS = 60;

/** More distinct whole numbers than this are measured or counted, not coded. */
const MOST_CODED_NUMBERS = 10;

/**
 * Guesses what a column is, from its name and what it holds.
 *
 * Takes the number of rows of the file. The guess is a start for a person: identifiers, counts,
 * person-time and clusters are known by name, the rest by content.
 */
export function guessKind(column: ColumnContents, rows: number): ColumnKind {
  const present = column.values.filter(({ value }) => missingReasonOf(value) === null);
  if (present.length === 0) return 'ignored';
  const missing = sumCounts(column) - present.reduce((sum, { count }) => sum + count, 0);
  const filled = rows - missing;
  return (
    byName(column, filled) ??
    byContent(
      column,
      present.map(({ value }) => value),
      filled,
    )
  );
}

function sumCounts(column: ColumnContents): number {
  return column.values.reduce((sum, { count }) => sum + count, 0);
}

const COUNT_NAME =
  /^(n|count|counts|freq|frequency|weight count|n?cases?|n?controls?|n?events?|n?deaths?|n?total|total n|denominator|persons|people|at risk|(n|num|number|no)( of)? (cases|controls|events|deaths|people|persons|records|total))$/;
const PERSON_TIME_NAME = /(person|patient)[ -]?(years?|months?|weeks?|days?|time)|^py(rs|s)?$/;
const PAIR_NAME = /^(pair|match|matched|matching)( ?(set|pair))?( ?(id|no|nr|number))?$/;
const CLUSTER_NAME = /^(cluster|household|family)( ?(id|no|nr|number))?$/;
const IDENTIFIER_NAME =
  /^(id|uid|uuid|key|(record|row|subject|participant|patient|person|guest|case|study|respondent|worker|member|sample|specimen)? ?(id|no|nr|number|code|key|identifier))$/;

/** A column of two values marks cases or events, whatever its name; it does not count them. */
const LEVELS_OF_A_MARK = 2;

/** The name as words in small letters, so that "nCases", "n_cases" and "N cases" are alike. */
function wordsOf(name: string): string {
  return name
    .replace(/([a-z])([A-Z])/g, '$1 $2')
    .replace(/[_.\s]+/g, ' ')
    .trim()
    .toLowerCase();
}

function byName(column: ColumnContents, filled: number): ColumnKind | null {
  const words = wordsOf(column.name);
  const numeric = column.numeric === filled && filled > 0;
  if (numeric && PERSON_TIME_NAME.test(words)) return 'personTime';
  if (numeric && column.distinct > LEVELS_OF_A_MARK && COUNT_NAME.test(words)) return 'count';
  if (PAIR_NAME.test(words)) return 'pairIdentifier';
  if (CLUSTER_NAME.test(words)) return 'clusterIdentifier';
  if (IDENTIFIER_NAME.test(words) && column.distinct * 2 > filled) return 'identifier';
  return null;
}

const SHARE_OF_NUMBERS = 0.9;

function byContent(column: ColumnContents, values: readonly string[], filled: number): ColumnKind {
  if (values.every(isDate)) return 'date';
  if (column.numeric === filled) return kindOfNumbers(column, values);
  if (column.numeric >= filled * SHARE_OF_NUMBERS && column.distinct > MOST_CODED_NUMBERS) {
    return 'number';
  }
  return kindOfText(column, values, filled);
}

function kindOfNumbers(column: ColumnContents, values: readonly string[]): ColumnKind {
  const coded = values.length <= MOST_CODED_NUMBERS && values.every(isSmallWholeNumber);
  return coded && !column.truncated ? 'category' : 'number';
}

/** Longer texts are remarks, not codes. */
const LONGEST_CODE = 200;

function kindOfText(column: ColumnContents, values: readonly string[], filled: number): ColumnKind {
  if (values.some((value) => value.length > LONGEST_CODE)) return 'ignored';
  if (column.truncated || values.length > MOST_LIKELY_LEVELS) {
    return column.distinct > filled * SHARE_OF_NUMBERS ? 'identifier' : 'ignored';
  }
  const { ground } = orderCodes(values);
  return ground === 'bounds' || ground === 'words' ? 'orderedCategory' : 'category';
}

function isSmallWholeNumber(value: string): boolean {
  return /^\s*-?\d{1,3}\s*$/.test(value);
}

function isDate(value: string): boolean {
  return /^\d{4}-\d{2}-\d{2}(?:[T ]\d{2}:\d{2}.*)?$|^\d{1,2}[./-]\d{1,2}[./-]\d{2,4}$/.test(
    value.trim(),
  );
}
