import { COUNTED_OUTCOME_COLUMN_ID, type CodeBook, type CodeBookColumn } from './code-book';
import { FACTOR_SOURCE } from './factor-levels';
import { caution, refusal, type CodeBookFinding } from './finding';
import type { DecimalMark } from './numerals';
import { parseNumber } from './numerals';
import { countColumnIds } from './propose-layout';
import { validateCountValues } from './validate-counts';

/** The distinct values of a data cut, by column id, and how the cut writes decimals. */
export interface DataValues {
  readonly decimalMark: DecimalMark;
  readonly valuesOf: ReadonlyMap<string, readonly string[]>;
}

/** Where a code book and the values of a data cut do not meet. */
export function validateAgainstData(
  codeBook: CodeBook,
  data: DataValues,
): readonly CodeBookFinding[] {
  const counting = countColumnIds(codeBook.layout);
  return codeBook.columns.flatMap((column, index) => {
    if (column.id === COUNTED_OUTCOME_COLUMN_ID) return [];
    const path = `columns.${String(index)}`;
    const values = data.valuesOf.get(column.id);
    const counts = counting.includes(column.id);
    if (values === undefined) return [columnNotInData(column, path, counts)];
    if (counts) return validateCountValues(column, path, values, data.decimalMark);
    return validateValues(column, path, values, data.decimalMark);
  });
}

function columnNotInData(column: CodeBookColumn, path: string, counts: boolean): CodeBookFinding {
  const message = `The data have no column "${column.name}".`;
  const place = { path, columnId: column.id };
  return counts
    ? refusal('columnNotInData', `${message} The rows can't be counted by it.`, place)
    : caution('columnNotInData', message, place);
}

function validateValues(
  column: CodeBookColumn,
  path: string,
  values: readonly string[],
  decimalMark: DecimalMark,
): readonly CodeBookFinding[] {
  const missing = new Set(column.missingCodes.map(({ code }) => code));
  const answers = values.filter((value) => !missing.has(value));
  const source = FACTOR_SOURCE[column.kind];
  if (source === 'levels') return validateLevelValues(column, path, answers);
  if (source !== 'bands' || column.bands.length === 0) return [];
  const words = answers.filter((value) => parseNumber(value, decimalMark) === null);
  return unmet('valuesNotNumbers', 'are no numbers', column, path, words);
}

function validateLevelValues(
  column: CodeBookColumn,
  path: string,
  answers: readonly string[],
): readonly CodeBookFinding[] {
  const present = new Set(answers);
  const known = new Set(column.levels.flatMap(({ codes }) => codes));
  const idle = column.levels.filter(({ codes }) => !codes.some((code) => present.has(code)));
  return [
    ...unmet(
      'valuesNotInCodeBook',
      'have no level',
      column,
      path,
      answers.filter((value) => !known.has(value)),
    ),
    ...idle.map((level) => idleLevel(column, path, level)),
  ];
}

function idleLevel(
  column: CodeBookColumn,
  path: string,
  { id, label }: { readonly id: string; readonly label: string },
): CodeBookFinding {
  const place = { path: `${path}.levels`, columnId: column.id, levelId: id };
  return id === column.referenceLevelId
    ? caution(
        'referenceNotInData',
        `The reference "${label}" of "${column.label}" has no records in the data.`,
        place,
      )
    : caution(
        'levelNotInData',
        `The level "${label}" of "${column.label}" has no records in the data.`,
        place,
      );
}

const SHOWN_VALUES = 5;

function unmet(
  code: 'valuesNotInCodeBook' | 'valuesNotNumbers',
  what: string,
  column: CodeBookColumn,
  path: string,
  values: readonly string[],
): readonly CodeBookFinding[] {
  if (values.length === 0) return [];
  const shown = values
    .slice(0, SHOWN_VALUES)
    .map((value) => (value.trim() === '' ? 'blank' : `"${value}"`));
  const more =
    values.length > SHOWN_VALUES ? ` and ${String(values.length - SHOWN_VALUES)} more` : '';
  const message =
    `Values of "${column.label}" that ${what}: ${shown.join(', ')}${more}. ` +
    'Records with them are left out and counted as such.';
  return [caution(code, message, { path, columnId: column.id, value: values[0] ?? '' })];
}
