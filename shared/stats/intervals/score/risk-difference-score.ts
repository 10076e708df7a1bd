import { cellsOf } from '../../check-counts';
import type { FourfoldTable } from '../../fourfold-table';
import { zeroOfDecreasing } from './bisection';
import { inflation, standardised } from './standardised';

/**
 * The score statistic as a function of the risk difference that is tested, decreasing in it:
 * (observed - tested difference) over its standard error under the constrained maximum likelihood.
 *
 * The constrained risk is found by bisection of the likelihood equation, not by the closed cubic,
 * which loses six digits with risks near 1e-7.
 * Source: Miettinen and Nurminen (1985) Statistics in Medicine 4:213-226.
 */
export function riskDifferenceScore(table: FourfoldTable): (difference: number) => number {
  const { index, reference } = table;
  const observed = index.events / index.total - reference.events / reference.total;
  return (difference) => {
    const referenceRisk = constrainedReferenceRisk(table, difference);
    const indexRisk = Math.min(1, Math.max(0, referenceRisk + difference));
    const variance =
      (indexRisk * (1 - indexRisk)) / index.total +
      (referenceRisk * (1 - referenceRisk)) / reference.total;
    return standardised(observed - difference, variance * inflation(table));
  };
}

function constrainedReferenceRisk(table: FourfoldTable, difference: number): number {
  const cells = cellsOf(table);
  const slope = (risk: number): number =>
    term(cells.indexEvents, risk + difference) -
    term(cells.indexOthers, 1 - risk - difference) +
    term(cells.referenceEvents, risk) -
    term(cells.referenceOthers, 1 - risk);
  return zeroOfDecreasing(slope, Math.max(0, -difference), Math.min(1, 1 - difference));
}

/** A cell's share in the slope of the log likelihood; an empty cell has none. */
function term(count: number, risk: number): number {
  return count === 0 ? 0 : count / risk;
}
