import type { TableElement, TableHeadCell } from '#shared/layout';
import { headPlaces } from '../../table-measure';

/**
 * Splits a table that is too wide for a page into panels below each other. Each repeats the labels
 * of its rows; columns under one spanner stay together. A panel may still be too wide where a
 * single spanner is.
 */
export function panelsOf(
  table: TableElement,
  fits: (panel: TableElement) => boolean,
): readonly TableElement[] {
  if (fits(table)) return [table];
  const panels: TableElement[] = [];
  let columns: readonly number[] = [];
  for (const group of columnGroups(table)) {
    const wider = [...columns, ...group];
    if (columns.length > 0 && !fits(withColumns(table, wider))) {
      panels.push(withColumns(table, columns));
      columns = group;
    } else {
      columns = wider;
    }
  }
  return [...panels, withColumns(table, columns)];
}

/** The columns under each cell of the topmost head row, the column of the labels left out. */
function columnGroups(table: TableElement): readonly (readonly number[])[] {
  const places = headPlaces(table)[0] ?? [];
  return places.flatMap((place, index) => {
    const span = table.head[0]?.[index]?.columnSpan ?? 1;
    const columns = Array.from({ length: span }, (_, offset) => place + offset);
    const own = columns.filter((column) => column > 0);
    return own.length === 0 ? [] : [own];
  });
}

function withColumns(table: TableElement, columns: readonly number[]): TableElement {
  const kept = [0, ...columns];
  const places = headPlaces(table);
  const keeps = (cell: TableHeadCell, place: number): boolean =>
    kept.some((column) => column >= place && column < place + cell.columnSpan);
  return {
    ...table,
    columns: table.columns.filter((_, index) => kept.includes(index)),
    head: table.head.map((cells, row) =>
      cells.filter((cell, index) => keeps(cell, places[row]?.[index] ?? 0)),
    ),
    rows: table.rows.map((row) => ({
      ...row,
      cells: row.cells.filter((_, index) => kept.includes(index)),
    })),
  };
}
