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
    if (JSON.stringify(own) === JSON.stringify(other)) return [];
    const label = (own ?? other)?.label ?? columnId;
    return [{ columnId, label, mine: described(own), theirs: described(other) }];
  });
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
