import {
  AlignmentType,
  BorderStyle,
  Paragraph,
  Table,
  TableCell,
  TableLayoutType,
  TableRow,
  VerticalAlignTable,
  WidthType,
  type IBorderOptions,
  type ITableCellOptions,
} from 'docx';
import type {
  Run,
  TableColumn,
  TableElement,
  TableHeadCell,
  TableRow as BodyRow,
} from '#shared/layout';
import { headPlaces, INDENT_IN_POINTS } from '../../table-measure';
import type { DocumentContext } from './document-context';
import { PARAGRAPH_STYLES } from './document-styles';
import { twips } from './page-setup';
import { CELL_MARGIN, columnWidths, type TableSetting } from './table-plan';
import { drawRuns, type TextLook } from './text-runs';

/** What a grid is set by, and whether the notes of its table follow it. */
export interface GridPlace {
  readonly setting: TableSetting;
  readonly notesFollow: boolean;
}

/** A native table with three rules: head rows repeat on every page, no row is torn in two. */
export function drawTableGrid(
  table: TableElement,
  { setting, notesFollow }: GridPlace,
  context: DocumentContext,
): Table {
  // Rounded down, so that a table never reaches past the margin.
  const widths = columnWidths(table, setting, context.houseStyle).map((width) =>
    Math.floor(width * 20),
  );
  const drawing: TableDrawing = { table, setting, notesFollow, context, widths };
  return new Table({
    width: { size: sum(drawing.widths), type: WidthType.DXA },
    columnWidths: drawing.widths,
    layout: TableLayoutType.FIXED,
    borders: NO_RULES,
    margins: { left: twips(CELL_MARGIN), right: twips(CELL_MARGIN), top: 0, bottom: 0 },
    tableLook: { firstRow: true, firstColumn: true, noHBand: true, noVBand: true },
    rows: [...headRows(drawing), ...bodyRows(drawing)],
  });
}

interface TableDrawing extends GridPlace {
  readonly table: TableElement;
  readonly context: DocumentContext;
  /** In twips. */
  readonly widths: readonly number[];
}

const NO_RULE: IBorderOptions = { style: BorderStyle.NONE, size: 0, color: 'auto' };
const NO_RULES = {
  top: NO_RULE,
  bottom: NO_RULE,
  left: NO_RULE,
  right: NO_RULE,
  insideHorizontal: NO_RULE,
  insideVertical: NO_RULE,
};

/** Sizes are eighths of a point. */
const OUTER_RULE: IBorderOptions = { style: BorderStyle.SINGLE, size: 8, color: '000000' };
const INNER_RULE: IBorderOptions = { style: BorderStyle.SINGLE, size: 4, color: '000000' };

const ALIGNMENTS = {
  start: AlignmentType.LEFT,
  end: AlignmentType.RIGHT,
  center: AlignmentType.CENTER,
} as const satisfies Readonly<Record<TableColumn['align'], unknown>>;

function headRows(drawing: TableDrawing): readonly TableRow[] {
  const { table } = drawing;
  const places = headPlaces(table);
  return table.head.map((cells, row) => {
    return new TableRow({
      tableHeader: true,
      cantSplit: true,
      children: cells.map((cell, index) =>
        headCell(cell, { row, column: places[row]?.[index] ?? index }, drawing),
      ),
    });
  });
}

interface CellPlace {
  readonly row: number;
  readonly column: number;
}

function headCell(cell: TableHeadCell, place: CellPlace, drawing: TableDrawing): TableCell {
  const last = place.row + cell.rowSpan >= drawing.table.head.length;
  const isSpanner = cell.columnSpan > 1 && !last;
  const paragraph = new Paragraph({
    style: PARAGRAPH_STYLES.tableHead,
    alignment: ALIGNMENTS[cell.align],
    keepNext: true,
    // The rule under a spanner belongs to its words, so that neighbours stay apart.
    ...(isSpanner ? { border: { bottom: { ...INNER_RULE, space: 1 } } } : {}),
    children: [...drawRuns(cell.runs, drawing.context.bookmarks, lookOf(drawing))],
  });
  return new TableCell({
    ...spanOf(place.column, cell.columnSpan, drawing),
    ...(cell.rowSpan > 1 ? { rowSpan: cell.rowSpan } : {}),
    verticalAlign: VerticalAlignTable.BOTTOM,
    borders: {
      ...(place.row === 0 ? { top: OUTER_RULE } : {}),
      ...(last ? { bottom: INNER_RULE } : {}),
    },
    children: [paragraph],
  });
}

function bodyRows(drawing: TableDrawing): readonly TableRow[] {
  const { rows } = drawing.table;
  return rows.map((row, index) => {
    const isLast = index === rows.length - 1;
    const place: RowPlace = {
      isLast,
      keepNext: isLast ? drawing.notesFollow : staysWithNext(rows, index),
    };
    return new TableRow({ cantSplit: true, children: bodyCells(row, place, drawing) });
  });
}

interface RowPlace {
  readonly isLast: boolean;
  readonly keepNext: boolean;
}

/** A table of at most so many rows stays on one page. */
const ROWS_KEPT_TOGETHER = 24;

/**
 * Short tables stay whole. Long ones break between groups: a group's head stays with its first
 * row, and the last rows stay with each other and with the notes.
 */
function staysWithNext(rows: readonly BodyRow[], index: number): boolean {
  return (
    rows.length <= ROWS_KEPT_TOGETHER ||
    rows[index]?.kind === 'group' ||
    rows[index + 2]?.kind === 'group' ||
    index >= rows.length - 2
  );
}

function bodyCells(row: BodyRow, place: RowPlace, drawing: TableDrawing): TableCell[] {
  const { columns } = drawing.table;
  return row.cells.map((cell, index) => {
    const isLast = index === row.cells.length - 1;
    const columnSpan = isLast ? columns.length - index : 1;
    return new TableCell({
      ...spanOf(index, columnSpan, drawing),
      ...(place.isLast ? { borders: { bottom: OUTER_RULE } } : {}),
      children: [bodyParagraph(cell.runs, { row, index, keepNext: place.keepNext }, drawing)],
    });
  });
}

interface BodyPlace {
  readonly row: BodyRow;
  readonly index: number;
  readonly keepNext: boolean;
}

function bodyParagraph(
  runs: readonly Run[],
  { row, index, keepNext }: BodyPlace,
  drawing: TableDrawing,
): Paragraph {
  const align = index === 0 ? 'start' : (drawing.table.columns[index]?.align ?? 'start');
  const indent = index === 0 && row.indent > 0 ? twips(row.indent * INDENT_IN_POINTS) : null;
  const look = { ...lookOf(drawing), ...(row.kind === 'group' ? { bold: true } : {}) };
  return new Paragraph({
    style: PARAGRAPH_STYLES.tableText,
    ...(align === 'start' ? {} : { alignment: ALIGNMENTS[align] }),
    ...(keepNext ? { keepNext } : {}),
    ...(row.kind === 'group' ? { spacing: { before: 80 } } : {}),
    ...(indent === null ? {} : { indent: { left: indent } }),
    children: [...drawRuns(runs, drawing.context.bookmarks, look)],
  });
}

/** Type that had to be made smaller than the style says. */
function lookOf({ setting, context }: TableDrawing): TextLook {
  const { tableSizeInPoints } = context.houseStyle.page;
  return setting.sizeInPoints === tableSizeInPoints ? {} : { size: setting.sizeInPoints * 2 };
}

function spanOf(
  column: number,
  columnSpan: number,
  { widths }: TableDrawing,
): Pick<ITableCellOptions, 'width' | 'columnSpan'> {
  return {
    width: { size: sum(widths.slice(column, column + columnSpan)), type: WidthType.DXA },
    ...(columnSpan > 1 ? { columnSpan } : {}),
  };
}

function sum(numbers: readonly number[]): number {
  return numbers.reduce((total, number) => total + number, 0);
}
