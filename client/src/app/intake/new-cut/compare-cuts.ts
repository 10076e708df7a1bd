import type { ColumnProfile, CutProfile } from '#shared/api';

/** One number of the last cut and of the new data. */
export interface ComparedNumber {
  readonly name: string;
  readonly before: string;
  readonly after: string;
}

const MOST_COLUMNS = 8;

/** What the new data hold more or less of than the last cut: rows, then blanks by column. */
export function compareCuts(before: CutProfile, after: CutProfile): readonly ComparedNumber[] {
  const blanks = after.columns.flatMap((column) => comparedBlanks(before, column));
  return [compared('Rows', before.rows, after.rows), ...blanks.slice(0, MOST_COLUMNS)];
}

function comparedBlanks(before: CutProfile, column: ColumnProfile): readonly ComparedNumber[] {
  const held = before.columns.find(({ name }) => name === column.name);
  if (held === undefined || held.blank === column.blank) return [];
  return [compared(`${column.name}, blank`, held.blank, column.blank)];
}

function compared(name: string, before: number, after: number): ComparedNumber {
  return { name, before: before.toLocaleString('en'), after: after.toLocaleString('en') };
}
