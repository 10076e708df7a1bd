import { parseNumber } from '../numerals';
import type { ColumnContents, FileProfile } from '../profile';
import { guessKind } from '../guess-kind';
import { columnIdsFor } from '../ids';

/** The contents of a column with these cells, for tests. */
export function contentsOf(name: string, cells: readonly string[]): ColumnContents {
  const counts = new Map<string, number>();
  for (const cell of cells) counts.set(cell, (counts.get(cell) ?? 0) + 1);
  const numbers = cells.map((cell) => parseNumber(cell, '.')).filter((value) => value !== null);
  return {
    name,
    distinct: [...counts.keys()].filter((value) => value.trim() !== '').length,
    blank: cells.filter((cell) => cell.trim() === '').length,
    numeric: numbers.length,
    minimum: numbers.length === 0 ? null : Math.min(...numbers),
    maximum: numbers.length === 0 ? null : Math.max(...numbers),
    sum: numbers.length === 0 ? null : numbers.reduce((sum, value) => sum + value, 0),
    values: [...counts].map(([value, count]) => ({ value, count })),
    truncated: false,
  };
}

/** The profile of a file given column by column, for tests. */
export function profileOf(columns: Readonly<Record<string, readonly string[]>>): FileProfile {
  const rows = Math.max(...Object.values(columns).map((cells) => cells.length));
  const ids = columnIdsFor(Object.keys(columns), new Map(), []);
  const profiled = Object.entries(columns).map(([name, cells], index) => {
    const contents = contentsOf(name, cells);
    return { ...contents, columnId: ids[index] ?? '', guessedKind: guessKind(contents, rows) };
  });
  return { rows, columns: profiled };
}
