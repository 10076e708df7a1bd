import type { TableBodyCell, TableColumn, TableElement, TableRow } from '#shared/layout';

/** A cell with the columns that it spans and how it is aligned. */
export interface PlacedCell {
  readonly cell: TableBodyCell;
  readonly columnSpan: number;
  readonly align: TableColumn['align'];
}

/** A body row whose first cell names it. */
export interface PlacedRow {
  readonly row: TableRow;
  readonly name: PlacedCell | null;
  readonly values: readonly PlacedCell[];
}

/** Rows that belong together: a group row and what follows it, up to the next. */
export interface TableSection {
  readonly rows: readonly PlacedRow[];
}

/**
 * The rows of a table as HTML wants them: one section (`tbody`) a group, each row with its name
 * apart, the last cell spanning what is left where a row has fewer cells than columns.
 */
export function tableSections(table: TableElement): readonly TableSection[] {
  const starts = table.rows.flatMap((row, index) =>
    index === 0 || row.kind === 'group' ? [index] : [],
  );
  return starts.map((start, index) => ({
    rows: table.rows.slice(start, starts[index + 1]).map((row) => placedRow(row, table.columns)),
  }));
}

function placedRow(row: TableRow, columns: readonly TableColumn[]): PlacedRow {
  const cells = row.cells.map((cell, index): PlacedCell => {
    const isLast = index === row.cells.length - 1;
    return {
      cell,
      columnSpan: isLast ? columns.length - index : 1,
      align: columns[index]?.align ?? 'start',
    };
  });
  return { row, name: cells[0] ?? null, values: cells.slice(1) };
}
