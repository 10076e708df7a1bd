import type { CodeBookColumn, CodeBookLevel } from './code-book';
import { FACTOR_SOURCE } from './factor-levels';
import { orderCodes } from './level-order';
import { missingReasonOf } from './missing-words';
import type { ProfiledColumn, ValueCount } from './profile';
import { levelsOfCodes, NOT_A_NUMBER, proposeMissingCodes } from './propose-column';

/** Something in which new data differ from what the code book knows, in plain words. */
export interface CodeBookDifference {
  readonly code:
    | 'columnNew'
    | 'columnGone'
    | 'countColumnGone'
    | 'levelNew'
    | 'levelGone'
    | 'missingNew'
    | 'noLongerNumbers';
  readonly columnId: string;
  readonly levelId: string | null;
  readonly message: string;
}

/** A column carried over, with its differences. */
export interface CarriedColumn {
  readonly column: CodeBookColumn;
  readonly differences: readonly CodeBookDifference[];
}

/** Carries one column over to what the new data hold under its name. */
export function carryColumn(column: CodeBookColumn, contents: ProfiledColumn): CarriedColumn {
  const source = FACTOR_SOURCE[column.kind];
  if (source === 'levels') return carryCategory(column, contents);
  return source === 'bands' ? carryNumber(column, contents) : { column, differences: [] };
}

function carryCategory(column: CodeBookColumn, contents: ProfiledColumn): CarriedColumn {
  const unknown = unknownValues(column, contents);
  const missing = unknown.filter(({ value }) => missingReasonOf(value) !== null);
  const fresh = unknown.filter(({ value }) => missingReasonOf(value) === null);
  const taken = [...column.levels, ...column.bands].map(({ id }) => id);
  const levels = levelsOfCodes(
    fresh.map(({ value }) => value),
    taken,
  );
  return {
    column: {
      ...column,
      levels: levels.reduce(withLevelPlaced, column.levels),
      missingCodes: [...column.missingCodes, ...missing.map(asMissing)],
    },
    differences: [
      ...levels.map((level, index) => newLevel(column, level, fresh[index]?.count ?? 0)),
      ...missing.map((value) => newMissing(column, value)),
      ...goneLevels(column, contents),
    ],
  };
}

function unknownValues(column: CodeBookColumn, contents: ProfiledColumn): readonly ValueCount[] {
  const known = new Set([
    ...column.levels.flatMap(({ codes }) => codes),
    ...column.missingCodes.map(({ code }) => code),
  ]);
  return contents.values.filter(({ value }) => !known.has(value));
}

function asMissing({ value }: ValueCount): { readonly code: string; readonly reason: string } {
  return { code: value, reason: missingReasonOf(value) ?? NOT_A_NUMBER };
}

/** Puts a level where its code belongs when the others stand in natural order, else last. */
function withLevelPlaced(
  levels: readonly CodeBookLevel[],
  level: CodeBookLevel,
): readonly CodeBookLevel[] {
  const firstCodes = levels.map(({ codes }) => codes[0] ?? '');
  const code = level.codes[0] ?? '';
  const { codes: ordered, ground } = orderCodes([...firstCodes, code]);
  const others = ordered.filter((other) => other !== code);
  const natural = ground !== 'appearance' && others.every((other, at) => other === firstCodes[at]);
  return levels.toSpliced(natural ? ordered.indexOf(code) : levels.length, 0, level);
}

function newLevel(column: CodeBookColumn, level: CodeBookLevel, count: number): CodeBookDifference {
  return {
    code: 'levelNew',
    columnId: column.id,
    levelId: level.id,
    message:
      `"${level.label}" in the column "${column.label}" is new, in ${rowsInWords(count)}. ` +
      'It was added as a level.',
  };
}

function newMissing(column: CodeBookColumn, { value, count }: ValueCount): CodeBookDifference {
  const shown = value.trim() === '' ? 'A blank' : `"${value}"`;
  return {
    code: 'missingNew',
    columnId: column.id,
    levelId: null,
    message:
      `${shown} in the column "${column.label}" is new, in ${rowsInWords(count)}. ` +
      'It was marked as missing.',
  };
}

function goneLevels(
  column: CodeBookColumn,
  contents: ProfiledColumn,
): readonly CodeBookDifference[] {
  if (contents.truncated) return [];
  const present = new Set(contents.values.map(({ value }) => value));
  const gone = column.levels.filter(({ codes }) => !codes.some((code) => present.has(code)));
  return gone.map((level) => ({
    code: 'levelGone',
    columnId: column.id,
    levelId: level.id,
    message: `No row has the level "${level.label}" of the column "${column.label}" any more.`,
  }));
}

function carryNumber(column: CodeBookColumn, contents: ProfiledColumn): CarriedColumn {
  const known = new Set(column.missingCodes.map(({ code }) => code));
  const words = proposeMissingCodes(contents, column.kind).filter(({ code }) => !known.has(code));
  const counts = new Map(contents.values.map(({ value, count }) => [value, count]));
  const told = words.filter(({ code }) => counts.has(code));
  if (contents.numeric === 0 && told.length > 0) return noLongerNumbers(column);
  return {
    column: { ...column, missingCodes: [...column.missingCodes, ...words] },
    differences: told.map(({ code }) =>
      newMissing(column, { value: code, count: counts.get(code) ?? 0 }),
    ),
  };
}

function noLongerNumbers(column: CodeBookColumn): CarriedColumn {
  const message = `The column "${column.label}" holds no numbers any more.`;
  return {
    column,
    differences: [{ code: 'noLongerNumbers', columnId: column.id, levelId: null, message }],
  };
}

function rowsInWords(count: number): string {
  return count === 1 ? '1 row' : `${String(count)} rows`;
}
