import { columnCount, type CountsGrid, type GridPlace, withRow, withText } from './counts-grid';
import { parsedCount } from './typed-count';

/** A grid after a paste, and how many pasted columns had no place in it. */
export interface PastedGrid {
  readonly grid: CountsGrid;
  readonly columnsLeftOver: number;
}

/**
 * Spreads a block copied from a spreadsheet (tabs and line ends) over the grid from a place on.
 * Adds the rows that it needs; a first line of headings is left out.
 */
export function pastedInto(grid: CountsGrid, place: GridPlace, text: string): PastedGrid {
  const lines = withoutHeadings(linesOf(text));
  const missing = Math.max(0, place.row + lines.length - grid.rows.length);
  const roomy = Array.from({ length: missing }).reduce<CountsGrid>(withRow, grid);
  const filled = lines.reduce(
    (soFar, cells, at) => withLine(soFar, { ...place, row: place.row + at }, cells),
    roomy,
  );
  const widest = Math.max(...lines.map((cells) => cells.length));
  return {
    grid: filled,
    columnsLeftOver: Math.max(0, place.column + widest - columnCount(grid)),
  };
}

/** Whether a pasted text is a block of cells, and not a word for one of them. */
export function isBlock(text: string): boolean {
  return /[\t\n]/.test(text.trim());
}

function linesOf(text: string): string[][] {
  const lines = text.replace(/\r\n?/g, '\n').replace(/\n+$/, '').split('\n');
  return lines.map((line) => line.split('\t').map((cell) => cell.trim()));
}

function withoutHeadings(lines: string[][]): string[][] {
  const [first, second] = lines;
  const isHeading = first !== undefined && !first.some(isCount) && second?.some(isCount) === true;
  return isHeading ? lines.slice(1) : lines;
}

function isCount(text: string): boolean {
  return parsedCount(text).ok;
}

function withLine(grid: CountsGrid, place: GridPlace, cells: readonly string[]): CountsGrid {
  return cells.reduce(
    (soFar, cell, at) => withText(soFar, { ...place, column: place.column + at }, cell),
    grid,
  );
}
