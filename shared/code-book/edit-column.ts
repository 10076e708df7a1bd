import {
  COUNTED_OUTCOME_COLUMN_ID,
  type CodeBook,
  type CodeBookColumn,
  type ColumnKind,
  type CountLayout,
} from './code-book';
import { FACTOR_SOURCE } from './factor-levels';
import type { ProfiledColumn } from './profile';
import { NOT_A_NUMBER, proposeLevels, proposeMissingCodes } from './propose-column';
import { countColumnIds, countedOutcomeColumn } from './propose-layout';

/** The words of a column; what is left out stays. */
export interface ColumnWords {
  readonly label?: string;
  readonly sentenceLabel?: string;
  readonly unit?: string | null;
}

/** The column with other words. */
export function renameColumn(column: CodeBookColumn, words: ColumnWords): CodeBookColumn {
  return { ...column, ...words };
}

/**
 * The column as another kind.
 *
 * Levels, bands and missing codes stay, so that changing back loses nothing; a category that has
 * no levels yet gets them from the file's contents, and words in a column of numbers are marked.
 */
export function changeKind(
  column: CodeBookColumn,
  kind: ColumnKind,
  contents: ProfiledColumn | null,
): CodeBookColumn {
  const changed = { ...column, kind };
  if (contents === null) return changed;
  if (FACTOR_SOURCE[kind] === 'bands') return withWordsMarked(changed, contents);
  return kind !== 'ignored' && changed.levels.length === 0
    ? withLevels(changed, contents)
    : changed;
}

function withLevels(column: CodeBookColumn, contents: ProfiledColumn): CodeBookColumn {
  const missingCodes = column.missingCodes.filter(({ reason }) => reason !== NOT_A_NUMBER);
  const levels = proposeLevels(contents, column.kind).filter(
    ({ codes }) => !missingCodes.some(({ code }) => codes.includes(code)),
  );
  return { ...column, missingCodes, levels };
}

function withWordsMarked(column: CodeBookColumn, contents: ProfiledColumn): CodeBookColumn {
  const known = new Set(column.missingCodes.map(({ code }) => code));
  const words = proposeMissingCodes(contents, column.kind).filter(({ code }) => !known.has(code));
  const marked = new Set(words.map(({ code }) => code));
  const levels = column.levels.filter(({ codes }) => !codes.some((code) => marked.has(code)));
  return { ...column, levels, missingCodes: [...column.missingCodes, ...words] };
}

/** The code book with one column exchanged for its edited form, found by id. */
export function replaceColumn(codeBook: CodeBook, column: CodeBookColumn): CodeBook {
  return {
    ...codeBook,
    columns: codeBook.columns.map((other) => (other.id === column.id ? column : other)),
  };
}

/**
 * The code book under another count layout.
 *
 * The columns that count become counts, those that no longer do become numbers, and the outcome
 * that two count columns stand for comes or goes; its words stay where it had them already.
 */
export function setLayout(codeBook: CodeBook, layout: CountLayout): CodeBook {
  const counting = countColumnIds(layout);
  const columns = codeBook.columns.map((column) => asCounted(column, counting));
  const outcome = countedOutcomeColumn(layout);
  const kept = codeBook.layout.kind === layout.kind && outcome !== null;
  const held = columns.find(({ id }) => id === outcome?.id);
  const others = columns.filter(({ id }) => id !== COUNTED_OUTCOME_COLUMN_ID);
  const ending = outcome === null ? [] : [kept && held !== undefined ? held : outcome];
  return { ...codeBook, layout, columns: [...others, ...ending] };
}

function asCounted(column: CodeBookColumn, counting: readonly string[]): CodeBookColumn {
  if (counting.includes(column.id)) return { ...column, kind: 'count' };
  return column.kind === 'count' ? { ...column, kind: 'number' } : column;
}
