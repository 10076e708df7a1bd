/**
 * Counts of a two-way table: `counts[row][column]`, whole numbers, rows of equal length. For an
 * exposure against an outcome, rows are the levels and columns events and others.
 */
export interface ContingencyTable {
  readonly counts: readonly (readonly number[])[];
}

/** One group of an ordered exposure, with the score that stands for its place. */
export interface ScoredGroup {
  readonly events: number;
  readonly total: number;
  readonly score: number;
}
