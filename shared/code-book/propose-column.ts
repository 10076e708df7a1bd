import type { CodeBookColumn, CodeBookLevel, ColumnKind, MissingCode } from './code-book';
import { FACTOR_SOURCE } from './factor-levels';
import { levelIdFor } from './ids';
import {
  labelOfCode,
  labelOfName,
  sentenceLabelOfLevel,
  sentenceLabelOfName,
  unitOfName,
} from './labels';
import { orderCodes } from './level-order';
import { BLANK_REASON, missingReasonOf } from './missing-words';
import { parseNumber } from './numerals';
import { WORDS_FOR_REFERENCE } from './ordered-words';
import type { ProfiledColumn } from './profile';

/** Reason of a text in a column of numbers. */
export const NOT_A_NUMBER = 'Not a number';

/** A column of the code book to start from, as the file's contents suggest it. */
export function proposeColumn(column: ProfiledColumn): CodeBookColumn {
  const label = labelOfName(column.name);
  const levels = proposeLevels(column, column.guessedKind);
  return {
    id: column.columnId,
    name: column.name,
    kind: column.guessedKind,
    label,
    sentenceLabel: sentenceLabelOfName(label),
    unit: unitOfName(column.name),
    levels,
    bands: [],
    missingCodes: proposeMissingCodes(column, column.guessedKind),
    referenceLevelId: proposeReference(levels, column.guessedKind),
  };
}

/** Levels for every value that is no missing code, in natural order; none for other kinds. */
export function proposeLevels(column: ProfiledColumn, kind: ColumnKind): readonly CodeBookLevel[] {
  if (FACTOR_SOURCE[kind] !== 'levels') return [];
  const codes = column.values.map(({ value }) => value);
  return levelsOfCodes(orderCodes(codes.filter((code) => missingReasonOf(code) === null)).codes);
}

/** One level for each code, in the order given, with ids that none of `taken` has. */
export function levelsOfCodes(
  codes: readonly string[],
  taken: readonly string[] = [],
): readonly CodeBookLevel[] {
  const ids = new Set(taken);
  return codes.map((code) => {
    const id = levelIdFor(code, ids);
    ids.add(id);
    const label = labelOfCode(code);
    return { id, codes: [code], label, sentenceLabel: sentenceLabelOfLevel(label) };
  });
}

/** The blank, the values that usually mean no answer, and texts where numbers are expected. */
export function proposeMissingCodes(
  column: ProfiledColumn,
  kind: ColumnKind,
): readonly MissingCode[] {
  const found = column.values
    .filter(({ value }) => value !== '')
    .map(({ value }) => ({ code: value, reason: reasonOf(value, kind, column) }));
  return [{ code: '', reason: BLANK_REASON }, ...found.filter(isMissing)];
}

function isMissing(code: {
  readonly code: string;
  readonly reason: string | null;
}): code is MissingCode {
  return code.reason !== null;
}

function reasonOf(value: string, kind: ColumnKind, column: ProfiledColumn): string | null {
  const reason = missingReasonOf(value);
  if (reason !== null || FACTOR_SOURCE[kind] !== 'bands') return reason;
  return isNumeral(value, column) ? null : NOT_A_NUMBER;
}

/** The profile counts numbers under the file's own decimal mark; a column keeps to one mark. */
function isNumeral(value: string, column: ProfiledColumn): boolean {
  if (column.numeric === 0) return false;
  return parseNumber(value, '.') !== null || parseNumber(value, ',') !== null;
}

function proposeReference(levels: readonly CodeBookLevel[], kind: ColumnKind): string | null {
  if (kind === 'orderedCategory') return levels[0]?.id ?? null;
  const named = levels.find(({ label }) => WORDS_FOR_REFERENCE.includes(label.toLowerCase()));
  return named?.id ?? null;
}
