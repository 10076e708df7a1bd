import { cellsOf } from '../../check-counts';
import type { FourfoldCells } from '../../check-counts';
import type { FourfoldTable } from '../../fourfold-table';
import { constrainedReferenceRisk } from './constrained-reference-risk';
import { standardised } from './standardised';

/** The score statistic as a function of the risk difference that is tested, decreasing in it. */
export function riskDifferenceScore(table: FourfoldTable): (difference: number) => number {
  const cells = cellsOf(table);
  return (difference) => scoreOfDifference(cells, difference);
}

/**
 * The score statistic of a tested risk difference: (observed - tested difference) over its standard
 * error under the constrained maximum likelihood.
 *
 * Source: Miettinen and Nurminen (1985) Statistics in Medicine 4:213-226.
 */
export function scoreOfDifference(cells: FourfoldCells, difference: number): number {
  const indexTotal = cells.indexEvents + cells.indexOthers;
  const referenceTotal = cells.referenceEvents + cells.referenceOthers;
  const observed = cells.indexEvents / indexTotal - cells.referenceEvents / referenceTotal;
  const referenceRisk = constrainedReferenceRisk(cells, difference);
  const indexRisk = Math.min(1, Math.max(0, referenceRisk + difference));
  const variance =
    (indexRisk * (1 - indexRisk)) / indexTotal +
    (referenceRisk * (1 - referenceRisk)) / referenceTotal;
  const total = indexTotal + referenceTotal;
  return standardised(observed - difference, (variance * total) / (total - 1));
}
