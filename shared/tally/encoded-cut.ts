import type { DecimalMark } from '#shared/code-book';

/** Codes of a column, one a row: places in its dictionary. */
export type Codes = Uint8Array | Uint16Array | Uint32Array;

/** A column as it is stored: its distinct values, and for each row which of them it holds. */
export interface EncodedColumn {
  readonly dictionary: readonly string[];
  readonly codes: Codes;
}

/** The columns of a data cut that counting needs, by column id. */
export interface EncodedCut {
  readonly rows: number;
  readonly decimalMark: DecimalMark;
  readonly columns: ReadonlyMap<string, EncodedColumn>;
}
