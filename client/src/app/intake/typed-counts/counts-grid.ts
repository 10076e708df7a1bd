import type { TypedCountsRequest } from '#shared/api';

/** What the two numbers of a cell are. */
export type CountsLayout = TypedCountsRequest['layout'];

/** One row as typed: a level and two texts per stratum, so that nothing typed is lost. */
export interface GridRow {
  readonly level: string;
  readonly cells: readonly string[];
}

/**
 * Counts as they are typed. `strata` names the column groups; an unstratified grid has one group
 * without a name. Every row holds two texts per group: events and total, or cases and controls.
 */
export interface CountsGrid {
  readonly stratified: boolean;
  readonly strata: readonly string[];
  readonly rows: readonly GridRow[];
}

/** Place of a text in the grid. Column 0 is the level's name, then two columns a stratum. */
export interface GridPlace {
  readonly row: number;
  readonly column: number;
}

/** A grid with two rows, ready to type in. */
export function emptyGrid(): CountsGrid {
  return { stratified: false, strata: [''], rows: [emptyRow(1), emptyRow(1)] };
}

/** How many columns a row has, its level's name included. */
export function columnCount(grid: CountsGrid): number {
  return 1 + 2 * grid.strata.length;
}

/** The text at a place. */
export function textAt(grid: CountsGrid, { row, column }: GridPlace): string {
  const found = grid.rows[row];
  return (column === 0 ? found?.level : found?.cells[column - 1]) ?? '';
}

/** The grid with another text at a place. */
export function withText(grid: CountsGrid, place: GridPlace, text: string): CountsGrid {
  const rows = grid.rows.map((row, at) =>
    at === place.row ? rowWithText(row, place.column, text) : row,
  );
  return { ...grid, rows };
}

/** The grid with one more empty row. */
export function withRow(grid: CountsGrid): CountsGrid {
  return { ...grid, rows: [...grid.rows, emptyRow(grid.strata.length)] };
}

/** The grid without a row; the last two stay. */
export function withoutRow(grid: CountsGrid, row: number): CountsGrid {
  if (grid.rows.length <= 2) return grid;
  return { ...grid, rows: grid.rows.filter((_, at) => at !== row) };
}

/** The grid with strata; the counts typed so far become those of the first. */
export function withStratum(grid: CountsGrid): CountsGrid {
  if (!grid.stratified) return withStratum({ ...grid, stratified: true });
  const rows = grid.rows.map((row) => ({ ...row, cells: [...row.cells, '', ''] }));
  return { ...grid, strata: [...grid.strata, ''], rows };
}

/** The grid without a stratum and its counts; the last but one makes it unstratified. */
export function withoutStratum(grid: CountsGrid, stratum: number): CountsGrid {
  if (grid.strata.length === 1) return grid;
  const strata = grid.strata.filter((_, at) => at !== stratum);
  const rows = grid.rows.map((row) => ({
    ...row,
    cells: row.cells.filter((_, at) => Math.floor(at / 2) !== stratum),
  }));
  const stratified = strata.length > 1;
  return { stratified, strata: stratified ? strata : [''], rows };
}

/** The grid with a stratum under another name. */
export function withStratumName(grid: CountsGrid, stratum: number, name: string): CountsGrid {
  return { ...grid, strata: grid.strata.map((each, at) => (at === stratum ? name : each)) };
}

function emptyRow(strata: number): GridRow {
  return { level: '', cells: Array.from({ length: 2 * strata }, () => '') };
}

function rowWithText(row: GridRow, column: number, text: string): GridRow {
  if (column === 0) return { ...row, level: text };
  return { ...row, cells: row.cells.map((each, at) => (at === column - 1 ? text : each)) };
}
