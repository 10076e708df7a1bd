import type { ColumnKind } from './code-book';

/** One distinct value of a column and the number of rows that hold it. */
export interface ValueCount {
  readonly value: string;
  readonly count: number;
}

/**
 * What a column of a file holds. `values` lists the commonest values in order of first appearance
 * (blank ones among them); `truncated` says that there are more. `numeric` counts rows that hold a
 * number, and `minimum`, `maximum` and `sum` are over those.
 */
export interface ColumnContents {
  readonly name: string;
  readonly distinct: number;
  readonly blank: number;
  readonly numeric: number;
  readonly minimum: number | null;
  readonly maximum: number | null;
  readonly sum: number | null;
  readonly values: readonly ValueCount[];
  readonly truncated: boolean;
}

/** The contents of a column under its lasting id, with a guess of what it is. */
export interface ProfiledColumn extends ColumnContents {
  readonly columnId: string;
  readonly guessedKind: ColumnKind;
}

/** What a file holds. */
export interface FileProfile {
  readonly rows: number;
  readonly columns: readonly ProfiledColumn[];
}
