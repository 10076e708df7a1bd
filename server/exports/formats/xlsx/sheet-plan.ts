import type { Run, TableColumn } from '#shared/layout';

/** A line along an edge of a cell. */
export type Rule = 'thin' | 'medium';

/** How a cell looks. */
export interface CellLook {
  readonly align?: TableColumn['align'];
  readonly bold?: boolean;
  readonly indent?: number;
  /** Breaks lines within the cell. */
  readonly wraps?: boolean;
  readonly top?: Rule;
  readonly bottom?: Rule;
}

/** What a cell holds: words, or a number with the format that shows it. */
export type CellContent =
  | { readonly kind: 'words'; readonly runs: readonly Run[] }
  | { readonly kind: 'number'; readonly value: number; readonly format: string }
  | { readonly kind: 'empty' };

/** A cell of a sheet. */
export interface SheetCell {
  readonly content: CellContent;
  readonly look: CellLook;
  /** The cell takes so many columns; those that it covers are given empty behind it. */
  readonly across: number;
}

/** A row of a sheet; a `paragraph` is words that run over the whole width. */
export type SheetRow =
  | { readonly kind: 'cells'; readonly cells: readonly SheetCell[] }
  | { readonly kind: 'paragraph'; readonly runs: readonly Run[]; readonly bold: boolean };

/** A sheet before it is written. Rows and columns count from 1. */
export interface SheetPlan {
  readonly name: string;
  readonly rows: readonly SheetRow[];
  /** Widest that a column may become, in points. */
  readonly widestColumn: number;
  /** These stay in sight, and are printed on every page. */
  readonly headRows: { readonly first: number; readonly last: number };
  readonly frozenColumns: number;
  readonly filtered: boolean;
}

/** A cell with words. */
export function words(text: string, look: CellLook = {}): SheetCell {
  return runsCell([{ text }], look);
}

/** A cell with styled words. */
export function runsCell(runs: readonly Run[], look: CellLook = {}, across = 1): SheetCell {
  return { content: { kind: 'words', runs }, look, across };
}

/** A cell with a number. */
export function numberCell(value: number, format: string, look: CellLook = {}): SheetCell {
  return { content: { kind: 'number', value, format }, look: { align: 'end', ...look }, across: 1 };
}

/** A cell without content; it may still have rules. */
export function emptyCell(look: CellLook = {}): SheetCell {
  return { content: { kind: 'empty' }, look, across: 1 };
}

/** A row of cells. */
export function cellsRow(cells: readonly SheetCell[]): SheetRow {
  return { kind: 'cells', cells };
}

/** Words over the whole width of a sheet. */
export function paragraphRow(runs: readonly Run[], bold = false): SheetRow {
  return { kind: 'paragraph', runs, bold };
}

/** Gives every cell of a row the same look beside its own. */
export function lookingLike(cells: readonly SheetCell[], look: CellLook): readonly SheetCell[] {
  return cells.map((cell) => ({ ...cell, look: { ...cell.look, ...look } }));
}
