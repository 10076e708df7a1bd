import { textWidth } from '#shared/figures';
import type { Run, TableBodyCell, TableElement, TableRow } from '#shared/layout';
import { printableText } from './printable-text';

/** The room that each column of a table needs, in points at a size of type. */
export interface ColumnNeed {
  /** So that no number and no word is broken. */
  readonly least: number;
  /** So that nothing wraps at all. */
  readonly most: number;
}

/**
 * Measures the columns of a table by the advance table of figures. The fonts that house styles name
 * are not at hand; their digits are narrower, their words at most a little wider.
 */
export function columnNeeds(table: TableElement, sizeInPoints: number): readonly ColumnNeed[] {
  const heads = headNeeds(table, sizeInPoints);
  return table.columns.map((_, index) => {
    const cells = table.rows.flatMap((row) => cellNeeds(row, index, sizeInPoints));
    const all = [...cells, heads[index] ?? NOTHING];
    return {
      least: Math.max(...all.map(({ least }) => least)),
      most: Math.max(...all.map(({ most }) => most)),
    };
  });
}

/** The text of runs, marks apart. */
export function textOf(runs: readonly Run[]): string {
  return printableText(runs.map(({ text }) => text).join(''));
}

/** The index of the column that each head cell of a row begins at, spans from above respected. */
export function headPlaces(table: TableElement): readonly (readonly number[])[] {
  const open = table.columns.map(() => 0);
  return table.head.map((row) => {
    let column = 0;
    const places = row.map((cell) => {
      while ((open[column] ?? 0) > 0) column += 1;
      const place = column;
      open.fill(cell.rowSpan, place, place + cell.columnSpan);
      column += cell.columnSpan;
      return place;
    });
    for (const [index, rows] of open.entries()) open[index] = Math.max(0, rows - 1);
    return places;
  });
}

const NOTHING: ColumnNeed = { least: 0, most: 0 };

/** A head may take so many lines before its column is made wider. */
const LINES_OF_HEAD = 3;

/** An indented label stands so many points to the right. */
export const INDENT_IN_POINTS = 9;

function cellNeeds(row: TableRow, index: number, size: number): readonly ColumnNeed[] {
  const cell = row.cells[index];
  if (cell === undefined || spansTheRest(row, index)) return [];
  const indent = index === 0 ? row.indent * INDENT_IN_POINTS : 0;
  const most = lineWidth(textOf(cell.runs), size) + indent;
  return [{ least: keepsOneLine(cell) ? most : longestWord(cell.runs, size) + indent, most }];
}

/** The last cell of a row that is short takes all that is left. */
function spansTheRest(row: TableRow, index: number): boolean {
  return row.kind === 'group' && index === row.cells.length - 1;
}

function keepsOneLine({ numbers }: TableBodyCell): boolean {
  return numbers.some((number) => number !== null);
}

function headNeeds(table: TableElement, size: number): readonly ColumnNeed[] {
  const needs = table.columns.map(() => NOTHING);
  for (const [rowIndex, places] of headPlaces(table).entries()) {
    for (const [cellIndex, place] of places.entries()) {
      const cell = table.head[rowIndex]?.[cellIndex];
      if (cell?.columnSpan === 1) needs[place] = headNeed(cell.runs, size);
    }
  }
  return needs;
}

/** Heads are bold, hence a little wider. */
function headNeed(runs: readonly Run[], size: number): ColumnNeed {
  const most = lineWidth(textOf(runs), size, 'semibold');
  return { least: Math.max(longestWord(runs, size, 'semibold'), most / LINES_OF_HEAD), most };
}

/** Words in the bold letters of common sans serif fonts take up to 4% more than measured. */
const RESERVE = 1.05;

type Weight = 'regular' | 'semibold';

function longestWord(runs: readonly Run[], size: number, weight: Weight = 'regular'): number {
  const words = textOf(runs).split(/[ \n\u2013-]/);
  return Math.max(0, ...words.map((word) => lineWidth(word, size, weight)));
}

function lineWidth(text: string, size: number, weight: Weight = 'regular'): number {
  const lines = text.split('\n');
  const widths = lines.map((line) => textWidth(line, { sizeInPixels: size, weight }));
  return Math.max(...widths) * RESERVE;
}
