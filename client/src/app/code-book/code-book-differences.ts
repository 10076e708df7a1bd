import type { CodeBook, CodeBookColumn } from '#shared/code-book';
import { COLUMN_KIND_WORDS, shownCode } from '../ui/code-book-editor/column-words';

/** A column that two code books describe differently, each in one line. */
export interface ColumnDifference {
  readonly columnId: string;
  readonly label: string;
  readonly mine: string;
  readonly theirs: string;
}

/** The columns in which two code books of one data set differ. */
export function columnDifferences(mine: CodeBook, theirs: CodeBook): readonly ColumnDifference[] {
  const ids = new Set([...mine.columns, ...theirs.columns].map(({ id }) => id));
  return [...ids].flatMap((columnId) => {
    const [own, other] = [columnOf(mine, columnId), columnOf(theirs, columnId)];
    if (isSame(own, other)) return [];
    const label = (own ?? other)?.label ?? columnId;
    return [{ columnId, label, mine: described(own), theirs: described(other) }];
  });
}

/**
 * Somebody's newer code book with one's own changes on top: a column that was changed here holds as
 * it is here, every other one as it is there.
 */
export function onTopOf(theirs: CodeBook, mine: CodeBook, base: CodeBook): CodeBook {
  const isMine = (columnId: string): boolean =>
    !isSame(columnOf(mine, columnId), columnOf(base, columnId));
  const kept = theirs.columns.map((column) =>
    isMine(column.id) ? (columnOf(mine, column.id) ?? column) : column,
  );
  const added = mine.columns.filter(
    ({ id }) => columnOf(theirs, id) === undefined && columnOf(base, id) === undefined,
  );
  const layout = isSame(mine.layout, base.layout) ? theirs.layout : mine.layout;
  return { ...theirs, layout, columns: [...kept, ...added] };
}

function isSame(one: unknown, other: unknown): boolean {
  return JSON.stringify(one) === JSON.stringify(other);
}

function columnOf({ columns }: CodeBook, columnId: string): CodeBookColumn | undefined {
  return columns.find(({ id }) => id === columnId);
}

function described(column: CodeBookColumn | undefined): string {
  if (column === undefined) return 'Not there';
  const kind = COLUMN_KIND_WORDS[column.kind];
  const parts = column.bands.length > 0 ? column.bands : column.levels;
  const levels = parts.map((part) => partWords(part, column.referenceLevelId));
  const missing = column.missingCodes.map(({ code, reason }) => `${shownCode(code)}: ${reason}`);
  return [
    `${column.label} (${column.sentenceLabel}), ${kind.toLowerCase()}`,
    levels.length === 0 ? '' : `levels ${levels.join(', ')}`,
    missing.length === 0 ? '' : `missing ${missing.join(', ')}`,
  ]
    .filter((part) => part !== '')
    .join('; ');
}

function partWords(
  part: CodeBookColumn['levels'][number] | CodeBookColumn['bands'][number],
  referenceLevelId: string | null,
): string {
  const codes = 'codes' in part && part.codes.length > 1 ? ` (${part.codes.join(', ')})` : '';
  const reference = part.id === referenceLevelId ? ', reference' : '';
  return `${part.label}${codes}${reference}`;
}
