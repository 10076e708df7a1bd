/** Keeps only records whose column has one of these levels. */
export interface Restriction {
  readonly columnId: string;
  readonly levelIds: readonly string[];
}

/** What to count: the factor columns, in order, under restrictions. */
export interface TallyRequest {
  readonly columnIds: readonly string[];
  readonly restrictions: readonly Restriction[];
}

/** One dimension of a tally: the levels that its cell indices point into. */
export interface TallyAxis {
  readonly columnId: string;
  readonly levelIds: readonly string[];
}

/** A non-zero cell: one level index per axis, and the whole-number count. */
export interface TallyCell {
  readonly at: readonly number[];
  readonly count: number;
}

/** Records left out for one reason (a missing or unknown code), by the first axis that lacks. */
export interface LeftOut {
  readonly columnId: string;
  readonly reason: string;
  readonly count: number;
}

/**
 * Sparse counts over the axes. `counted` is the sum of the cells; `restricted` records did not meet
 * a restriction; `counted + restricted + sum(leftOut)` is the weight of the whole cut.
 */
export interface Tally {
  readonly axes: readonly TallyAxis[];
  readonly cells: readonly TallyCell[];
  readonly counted: number;
  readonly restricted: number;
  readonly leftOut: readonly LeftOut[];
}
