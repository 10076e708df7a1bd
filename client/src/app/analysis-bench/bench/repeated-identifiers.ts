import type { CutView } from '#shared/api';
import type { CodeBook } from '#shared/code-book';

/** Identifiers that come more than once in a cut. */
export interface RepeatedIdentifiers {
  readonly columnId: string;
  readonly columnLabel: string;
  readonly identifiers: number;
  readonly records: number;
}

/**
 * The first identifier column with values that repeat; null when there is none. Files whose rows
 * are counts are not asked: there a row is no person.
 */
export function repeatedIdentifiers(
  codeBook: CodeBook | null,
  cut: CutView | null,
): RepeatedIdentifiers | null {
  if (codeBook === null || cut === null || codeBook.layout.kind !== 'records') return null;
  for (const { id, kind, label } of codeBook.columns) {
    const contents = cut.profile.columns.find(({ columnId }) => columnId === id);
    if (kind !== 'identifier' || contents === undefined) continue;
    const repeated = contents.values.filter(({ value, count }) => value !== '' && count > 1);
    if (repeated.length === 0) continue;
    const records = repeated.reduce((sum, { count }) => sum + count, 0);
    return { columnId: id, columnLabel: label, identifiers: repeated.length, records };
  }
  return null;
}
