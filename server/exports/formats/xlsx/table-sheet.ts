import type {
  CellNumber,
  TableBodyCell,
  TableColumn,
  TableElement,
  TableHeadCell,
  TableRow,
} from '#shared/layout';
import type { NumberStyle } from '#shared/house-style';
import { headPlaces } from '../../table-measure';
import { displayedNumber } from './displayed-number';
import {
  cellsRow,
  emptyCell,
  lookingLike,
  numberCell,
  paragraphRow,
  runsCell,
  words,
  type SheetCell,
  type SheetPlan,
  type SheetRow,
} from './sheet-plan';

/**
 * A table as a sheet: caption, heads, one number a cell, notes. A column whose cells hold several
 * numbers (an estimate with its limits, events out of a total) becomes one column for each.
 */
export function tableSheet(table: TableElement, style: NumberStyle): SheetPlan {
  const heads = headRows(table);
  const body = table.rows.map((row, index) =>
    cellsRow(
      index === table.rows.length - 1
        ? lookingLike(bodyCells(row, table, style), { bottom: 'medium' })
        : bodyCells(row, table, style),
    ),
  );
  const { label, number, runs } = table.caption;
  return {
    name: `${label} ${String(number)}`,
    rows: [
      paragraphRow([{ text: `${label} ${String(number)}. ` }, ...runs], true),
      ...heads,
      ...body,
      ...table.notes.map((note) => paragraphRow(note)),
    ],
    widestColumn: 190,
    headRows: { first: 2, last: 1 + heads.length },
    frozenColumns: 1,
    filtered: false,
  };
}

/** Columns of the sheet that a column of the table takes. */
function breadth({ parts }: TableColumn): number {
  return Math.max(1, parts.length);
}

function headRows(table: TableElement): readonly SheetRow[] {
  const places = headPlaces(table);
  const hasParts = table.columns.some(({ parts }) => parts.length > 1);
  const rows = table.head.map((_, row) => headCells(table, places, row, hasParts));
  const all = hasParts ? [...rows, partCells(table, places)] : rows;
  return all.map((cells, index) =>
    cellsRow(
      lookingLike(cells, {
        bold: true,
        wraps: true,
        ...(index === 0 ? { top: 'medium' } : {}),
        ...(index === all.length - 1 ? { bottom: 'thin' } : {}),
      }),
    ),
  );
}

type HeadPlaces = readonly (readonly number[])[];

/** Heads of single columns stand directly over their numbers, whatever is above. */
function headCells(
  table: TableElement,
  places: HeadPlaces,
  row: number,
  hasParts: boolean,
): readonly SheetCell[] {
  const cells: SheetCell[] = [];
  for (const [column, shape] of table.columns.entries()) {
    const head = headAt(table, places, row, column);
    const standsHere = head?.rowSpan === 1 && (!hasParts || !isSingle(head, shape, row, table));
    if (head === undefined && isCovered(table, places, row, column)) continue;
    if (head === undefined || !standsHere) {
      cells.push(...blanks(head === undefined ? breadth(shape) : spanBreadth(table, head, column)));
    } else {
      cells.push(...spanner(head, spanBreadth(table, head, column)));
    }
  }
  return cells;
}

function isSingle(
  head: TableHeadCell,
  shape: TableColumn,
  row: number,
  table: TableElement,
): boolean {
  return head.columnSpan === 1 && breadth(shape) === 1 && row === table.head.length - 1;
}

function spanBreadth(table: TableElement, { columnSpan }: TableHeadCell, column: number): number {
  const spanned = table.columns.slice(column, column + columnSpan);
  return spanned.reduce((total, shape) => total + breadth(shape), 0);
}

function headAt(
  table: TableElement,
  places: HeadPlaces,
  row: number,
  column: number,
): TableHeadCell | undefined {
  const index = places[row]?.indexOf(column) ?? -1;
  return index < 0 ? undefined : table.head[row]?.[index];
}

/** Whether a spanner to the left reaches over the column. */
function isCovered(table: TableElement, places: HeadPlaces, row: number, column: number): boolean {
  return (places[row] ?? []).some((place, index) => {
    const span = table.head[row]?.[index]?.columnSpan ?? 1;
    return place < column && column < place + span;
  });
}

function spanner(head: TableHeadCell, across: number): readonly SheetCell[] {
  const rule = across > 1 ? ({ bottom: 'thin' } as const) : {};
  const align = across > 1 ? 'center' : head.align;
  return [runsCell(head.runs, { align, ...rule }, across), ...blanks(across - 1, rule)];
}

function blanks(count: number, look: SheetCell['look'] = {}): readonly SheetCell[] {
  return Array.from({ length: count }, () => emptyCell(look));
}

/** The lowest row of heads: the parts of columns that were split, and the heads of the others. */
function partCells(table: TableElement, places: HeadPlaces): readonly SheetCell[] {
  return table.columns.flatMap((shape, column): readonly SheetCell[] => {
    if (breadth(shape) > 1) return shape.parts.map(({ label }) => words(label, { align: 'end' }));
    const heads = table.head.map((_, row) => headAt(table, places, row, column));
    const own = heads.findLast((head) => head?.columnSpan === 1);
    return [own === undefined ? emptyCell() : runsCell(own.runs, { align: own.align })];
  });
}

function bodyCells(row: TableRow, table: TableElement, style: NumberStyle): readonly SheetCell[] {
  const cells = table.columns.flatMap((shape, column): readonly SheetCell[] => {
    const cell = row.cells[column];
    if (cell === undefined) return blanks(breadth(shape));
    return column === 0
      ? [runsCell(cell.runs, { align: 'start', indent: row.indent })]
      : numberCells(cell, shape, style);
  });
  return row.kind === 'group' ? lookingLike(cells, { bold: true }) : cells;
}

function numberCells(
  cell: TableBodyCell,
  shape: TableColumn,
  style: NumberStyle,
): readonly SheetCell[] {
  const { align } = shape;
  if (cell.numbers.every((number) => number === null)) {
    return [runsCell(cell.runs, { align }), ...blanks(breadth(shape) - 1)];
  }
  return cell.numbers.map((number) => (number === null ? emptyCell() : shown(number, style)));
}

function shown(number: CellNumber, style: NumberStyle): SheetCell {
  const { value, format } = displayedNumber(number, style);
  return numberCell(value, format);
}
