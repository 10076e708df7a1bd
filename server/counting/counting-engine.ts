import type { CodeBook } from '#shared/code-book';
import type { Result } from '#shared/core';
import type { Tally, TallyIssue, TallyRequest } from '#shared/tally';

/**
 * Counts the records of a data cut. Rows stay behind this port: only whole-number counts come out,
 * so that the rows may one day lie in another system.
 */
export interface CountingEngine {
  /** Counts a ready cut under a code book, along the levels of some columns. */
  readonly count: (
    cutId: string,
    codeBook: CodeBook,
    request: TallyRequest,
  ) => Promise<Result<Tally, TallyIssue>>;
  /** Why the rows of a cut can't be counted by the columns that the code book names; else null. */
  readonly checkCounts: (cutId: string, codeBook: CodeBook) => Promise<TallyIssue | null>;
  /** A window of the rows as text, column by column in the order of the file. */
  readonly records: (cutId: string, window: RecordsWindow) => Promise<Records>;
}

/** Which rows: from `offset` on, at most `limit`. */
export interface RecordsWindow {
  readonly offset: number;
  readonly limit: number;
}

/** Rows of a cut as they stood in the file. */
export interface Records {
  readonly columns: readonly string[];
  readonly rows: readonly (readonly string[])[];
  readonly total: number;
}
