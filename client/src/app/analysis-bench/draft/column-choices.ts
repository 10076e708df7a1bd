import { keptLevels } from '#shared/analysis';
import { type CodeBook, type CodeBookColumn, factorLevels } from '#shared/code-book';

/** More levels than this are no strata or exposure that a table can show. */
export const MOST_LEVELS = 40;

/** Columns that can be counted by: those with levels or bands, not too many. */
export function factorColumns(codeBook: CodeBook): readonly CodeBookColumn[] {
  return codeBook.columns.filter((column) => {
    const levels = factorLevels(column).length;
    return levels > 0 && levels <= MOST_LEVELS;
  });
}

/** The column of an id, or null. */
export function columnById(codeBook: CodeBook | null, id: string | null): CodeBookColumn | null {
  return codeBook?.columns.find((column) => column.id === id) ?? null;
}

/** Labels of the levels of an id list, in the column's order. */
export function levelLabels(
  column: CodeBookColumn | null,
  levelIds: readonly string[],
): readonly string[] {
  if (column === null) return [];
  const levels = keptLevels(column, []);
  return levels.filter(({ id }) => levelIds.includes(id)).map(({ label }) => label);
}
