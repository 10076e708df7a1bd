import { failure, success, type Result } from '#shared/core';
import type { CodeBook } from '#shared/code-book';
import { cellsOf, type CellCounter, type GridDigit } from './cell-grid';
import { createByteCounter, MOST_PACKED_CELLS } from './count-bytes';
import { createNumberCounter, MOST_CELLS } from './count-numbers';
import type { EncodedCut } from './encoded-cut';
import { createFold } from './fold-cells';
import { rowWeights, type RowWeights } from './row-weights';
import type { Tally, TallyRequest } from './tally';
import { gridOf, type TallyGrid } from './tally-grid';
import type { TallyIssue } from './tally-issue';
import { planTally, type TallyPlan } from './tally-plan';

/** A count under way: rows are added range by range, so that a long count can pause. */
export interface TallyCounter {
  /** Counts the rows from `from` up to, without, `to`; each row is to be added once. */
  readonly add: (from: number, to: number) => void;
  /** The counts of the rows added so far. */
  readonly finish: () => Result<Tally, TallyIssue>;
}

/**
 * Prepares to count the records of a cut under its code book.
 *
 * Gives exact whole numbers; fails when the request names what is not there, when a count column
 * holds no counts, or when there are more combinations of levels than can be kept.
 */
export function createTallyCounter(
  cut: EncodedCut,
  codeBook: CodeBook,
  request: TallyRequest,
): Result<TallyCounter, TallyIssue> {
  const plan = planTally(cut, codeBook, request);
  if (!plan.ok) return plan;
  const weights = rowWeights(cut, codeBook);
  if (!weights.ok) return weights;
  const grid = gridOf(plan.value, cut.rows);
  if (cellsOf(grid.digits) > MOST_CELLS) return failure({ code: 'tooManyCells' });
  return success(counterOver(plan.value, grid, weights.value));
}

/** Counts all records of a cut at once; otherwise as `createTallyCounter`. */
export function countTally(
  cut: EncodedCut,
  codeBook: CodeBook,
  request: TallyRequest,
): Result<Tally, TallyIssue> {
  const counter = createTallyCounter(cut, codeBook, request);
  if (!counter.ok) return counter;
  counter.value.add(0, cut.rows);
  return counter.value.finish();
}

function counterOver(
  plan: TallyPlan,
  grid: TallyGrid,
  weights: readonly RowWeights[],
): TallyCounter {
  const layers = weights.map((layer) => ({ layer, counter: cellCounter(grid.digits, layer) }));
  return {
    add: (from, to) => {
      for (const { counter } of layers) counter.add(from, to);
    },
    finish: () => {
      const fold = createFold(plan, grid);
      for (const { layer, counter } of layers) fold.add(counter, layer);
      return fold.finish();
    },
  };
}

function cellCounter(digits: readonly GridDigit[], layer: RowWeights): CellCounter {
  const bytes = digits.every(({ size }) => size <= 256);
  return bytes && layer.counts === null && cellsOf(digits) <= MOST_PACKED_CELLS
    ? createByteCounter(digits)
    : createNumberCounter(digits, layer);
}
