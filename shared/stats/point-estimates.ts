import { cellsOf } from './check-counts';
import { productDifference } from './exact';
import type { FourfoldTable } from './fourfold-table';

/** Risk of the index group minus risk of the reference group; both groups hold someone. */
export function riskDifferenceOf({ index, reference }: FourfoldTable): number {
  const difference = productDifference(
    index.events,
    reference.total,
    reference.events,
    index.total,
  );
  return difference / (index.total * reference.total);
}

/** Risk of the index group over risk of the reference group; Infinity or NaN without events. */
export function riskRatioOf({ index, reference }: FourfoldTable): number {
  return (index.events * reference.total) / (reference.events * index.total);
}

/** Odds of the index group over odds of the reference group; Infinity or NaN with zero cells. */
export function oddsRatioOf(table: FourfoldTable): number {
  const cells = cellsOf(table);
  return (cells.indexEvents * cells.referenceOthers) / (cells.indexOthers * cells.referenceEvents);
}
