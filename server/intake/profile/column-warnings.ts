import { FACTOR_SOURCE, missingReasonOf, type ProfiledColumn } from '#shared/code-book';
import type { IntakeWarning } from '#shared/api';
import type { NumberTotals } from './number-totals';
import { LISTED_VALUES } from './column-summary';

/** A column with what its warnings go by. */
export interface ColumnFacts {
  readonly column: ProfiledColumn;
  readonly numbers: NumberTotals;
  /** Distinct values such as "1,234", which were not read as numbers. */
  readonly unreadGrouped: number;
  readonly rows: number;
}

/** What is odd in a column, in plain words. */
export function columnWarnings(facts: ColumnFacts): readonly IntakeWarning[] {
  return RULES.flatMap((rule) => {
    const found = rule(facts);
    if (found === null) return [];
    return [{ code: found.code, columnId: facts.column.columnId, message: found.message }];
  });
}

type Rule = (facts: ColumnFacts) => { readonly code: string; readonly message: string } | null;

const RULES: readonly Rule[] = [
  emptyOrMostlyBlank,
  caseVariants,
  mixedNumbersAndText,
  groupedNumbers,
  tooManyLevels,
  totalAmongLevels,
  unusableCount,
  possibleMissingCode,
];

const MOSTLY = 0.5;

function emptyOrMostlyBlank({ column, rows }: ColumnFacts): ReturnType<Rule> {
  if (column.blank === rows) {
    return { code: 'emptyColumn', message: `"${column.name}" is empty.` };
  }
  if (column.blank <= rows * MOSTLY) return null;
  const share = Math.floor((column.blank / rows) * 100);
  return {
    code: 'mostlyBlank',
    message: `"${column.name}" is blank in ${String(share)} % of rows.`,
  };
}

const SHOWN_PAIRS = 3;

function caseVariants({ column }: ColumnFacts): ReturnType<Rule> {
  if (column.truncated || column.numeric > 0) return null;
  const groups = new Map<string, string[]>();
  for (const { value } of column.values) {
    const key = value.normalize('NFC').trim().replace(/\s+/g, ' ').toLowerCase();
    if (key !== '') groups.set(key, [...(groups.get(key) ?? []), value]);
  }
  const alike = [...groups.values()].filter(({ length }) => length > 1);
  if (alike.length === 0) return null;
  const shown = alike
    .slice(0, SHOWN_PAIRS)
    .map((values) => values.map((value) => `"${value}"`).join(' and '));
  const message = `Values of "${column.name}" differ only by case or blanks: ${shown.join('; ')}.`;
  return { code: 'caseVariants', message };
}

const SHOWN_VALUES = 3;

function mixedNumbersAndText({ column, rows }: ColumnFacts): ReturnType<Rule> {
  const words = column.values.filter(
    ({ value }) => missingReasonOf(value) === null && !/^[\s+\-\u2212]*[\d.,]+\s*$/.test(value),
  );
  if (column.numeric < (rows - column.blank) * MOSTLY || words.length === 0) return null;
  const shown = words.slice(0, SHOWN_VALUES).map(({ value }) => `"${value}"`);
  const more = words.length > SHOWN_VALUES ? ' and others' : '';
  return {
    code: 'mixedNumbersAndText',
    message: `"${column.name}" holds numbers, and texts among them: ${shown.join(', ')}${more}.`,
  };
}

function groupedNumbers({ column, unreadGrouped }: ColumnFacts): ReturnType<Rule> {
  const spaced = column.values.filter(({ value }) =>
    /^\d{1,3}(?:[ '\u2019\u00a0\u202f]\d{3})+$/.test(value.trim()),
  );
  if (unreadGrouped + spaced.length === 0) return null;
  return {
    code: 'groupedNumbers',
    message:
      `"${column.name}" holds numbers with a mark between thousands, which are read as text. ` +
      'Save them without that mark.',
  };
}

function tooManyLevels({ column }: ColumnFacts): ReturnType<Rule> {
  if (column.guessedKind !== 'ignored' || column.blank === column.distinct) return null;
  if (column.distinct === 0) return null;
  const distinct =
    column.distinct > LISTED_VALUES ? `more than ${String(LISTED_VALUES)}` : column.distinct;
  return {
    code: 'tooManyLevels',
    message: `"${column.name}" has ${String(distinct)} different texts, too many for levels.`,
  };
}

function totalAmongLevels({ column }: ColumnFacts): ReturnType<Rule> {
  if (FACTOR_SOURCE[column.guessedKind] !== 'levels') return null;
  const total = column.values.find(({ value }) =>
    /^(grand |sub)?totals?$|^overall$|^sum$|^all$/i.test(value.trim()),
  );
  if (total === undefined) return null;
  return {
    code: 'totalAmongLevels',
    message:
      `"${total.value}" in "${column.name}" looks like a sum of other rows, which would then ` +
      'count twice.',
  };
}

function unusableCount({ column, numbers }: ColumnFacts): ReturnType<Rule> {
  if (column.guessedKind !== 'count') return null;
  if (numbers.negative > 0) {
    const rows = rowsInWords(numbers.negative);
    const message = `"${column.name}" looks like a count but is negative in ${rows}.`;
    return { code: 'negativeCount', message };
  }
  if (numbers.fractional === 0) return null;
  const rows = rowsInWords(numbers.fractional);
  const message = `"${column.name}" looks like a count but is not whole in ${rows}.`;
  return { code: 'fractionalCount', message };
}

const NEGATIVE_CODES = [-1, -7, -8, -9, -88, -99, -888, -999];
const LARGE_CODES = [888, 999, 8888, 9999, 99_999];

/** A code for no answer is far from every other number of its column. */
const FAR = 3;

function possibleMissingCode({ column }: ColumnFacts): ReturnType<Rule> {
  if (FACTOR_SOURCE[column.guessedKind] !== 'bands' || column.guessedKind === 'count') return null;
  const numbers = column.values.map(({ value, count }) => ({ number: Number(value), count }));
  const suspect = [...NEGATIVE_CODES, ...LARGE_CODES].find((code) => {
    const others = numbers.filter(({ number }) => number !== code).map(({ number }) => number);
    const alone =
      code < 0
        ? others.every((other) => !(other < 0))
        : others.every((other) => !(other * FAR > code));
    return alone && numbers.some(({ number }) => number === code);
  });
  if (suspect === undefined) return null;
  const rows = numbers.find(({ number }) => number === suspect)?.count ?? 0;
  return {
    code: 'possibleMissingCode',
    message:
      `${String(suspect)} in "${column.name}", in ${rowsInWords(rows)}, looks like a code for ` +
      'no answer. If it is one, mark it as missing.',
  };
}

function rowsInWords(rows: number): string {
  return rows === 1 ? '1 row' : `${String(rows)} rows`;
}
