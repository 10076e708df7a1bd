import type { FourfoldTable } from '../../fourfold-table';
import { constrainedReferenceRisk } from './constrained-reference-risk';
import { inflation, standardised } from './standardised';

/**
 * The score statistic as a function of the risk difference that is tested, decreasing in it:
 * (observed - tested difference) over its standard error under the constrained maximum likelihood.
 *
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
