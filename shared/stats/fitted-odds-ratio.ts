import { cellsOf } from './check-counts';
import type { FourfoldTable } from './fourfold-table';

/** How far a table lies from the one that its margins and an odds ratio lead to expect. */
export interface OddsRatioFit {
  /** Observed minus expected events of the index group. */
  readonly deviation: number;
  readonly variance: number;
}

/**
 * Fits a table with the same margins and a given odds ratio, by its logarithm.
 *
 * The quadratic is solved for the cell that shrinks fastest, with the ratio turned below 1, so that
 * nothing cancels however far the ratio is. Variance: 1 / sum of 1 / expected cells.
 */
export function fitOddsRatio(table: FourfoldTable, logRatio: number): OddsRatioFit {
  const { shrinking, opposite, beside, below } = orientedCells(table, logRatio);
  const ratio = Math.exp(-Math.abs(logRatio));
  const row = shrinking + beside;
  const column = shrinking + below;
  const rest = opposite - shrinking;
  const linear = rest + ratio * (row + column);
  const root = Math.sqrt(linear * linear + 4 * (1 - ratio) * ratio * row * column);
  const expected = (2 * ratio * row * column) / (linear + root);
  const precision =
    1 / expected + 1 / (row - expected) + 1 / (column - expected) + 1 / (rest + expected);
  const deviation = shrinking - expected;
  return { deviation: logRatio > 0 ? 0 - deviation : deviation, variance: 1 / precision };
}

interface OrientedCells {
  readonly shrinking: number;
  readonly opposite: number;
  readonly beside: number;
  readonly below: number;
}

/** The diagonal that a ratio empties, its smaller cell first, and the two other cells. */
function orientedCells(table: FourfoldTable, logRatio: number): OrientedCells {
  const { indexEvents, indexOthers, referenceEvents, referenceOthers } = cellsOf(table);
  const [first, second, third, fourth] =
    logRatio > 0
      ? [indexOthers, referenceEvents, indexEvents, referenceOthers]
      : [indexEvents, referenceOthers, indexOthers, referenceEvents];
  return {
    shrinking: Math.min(first, second),
    opposite: Math.max(first, second),
    beside: third,
    below: fourth,
  };
}
