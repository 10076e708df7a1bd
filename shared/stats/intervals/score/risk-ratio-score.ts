import { cellsOf } from '../../check-counts';
import type { FourfoldTable, GroupCount } from '../../fourfold-table';
import { standardised } from './standardised';

/**
 * The score statistic as a function of the logarithm of the tested risk ratio, decreasing in it.
 *
 * `factor` enlarges the variance: 1 for Koopman, N / (N - 1) for Miettinen and Nurminen. The group
 * with the smaller tested risk is put on top, so that the ratio is at most 1 and nothing cancels.
 * Source: Koopman (1984) Biometrics 40:513-517; Miettinen and Nurminen (1985).
 */
export function riskRatioScore(table: FourfoldTable, factor: number): (logRatio: number) => number {
  const turned = { index: table.reference, reference: table.index };
  return (logRatio) =>
    logRatio > 0 ? 0 - scoreBelow(turned, -logRatio, factor) : scoreBelow(table, logRatio, factor);
}

/** The score at a ratio of at most 1. */
function scoreBelow(table: FourfoldTable, logRatio: number, factor: number): number {
  const { index, reference } = table;
  const ratio = Math.exp(logRatio);
  const shortfall = -Math.expm1(logRatio);
  const otherShare = constrainedReferenceOthers(table, ratio, shortfall);
  const referenceRisk = otherShare < 0.5 ? 1 - otherShare : constrainedReferenceRisk(table, ratio);
  const indexRisk = ratio * referenceRisk;
  const variance =
    (indexRisk * (shortfall + ratio * otherShare)) / index.total +
    (ratio * ratio * referenceRisk * otherShare) / reference.total;
  return standardised(deviation(index, reference, ratio, shortfall), variance * factor);
}

/** The constrained reference risk where it is small: root of the likelihood's quadratic in it. */
function constrainedReferenceRisk({ index, reference }: FourfoldTable, ratio: number): number {
  const square = (index.total + reference.total) * ratio;
  const linear = index.events + reference.total + (index.total + reference.events) * ratio;
  const constant = index.events + reference.events;
  const discriminant = Math.max(0, linear * linear - 4 * square * constant);
  return (2 * constant) / (linear + Math.sqrt(discriminant));
}

/** Index risk less ratio times reference risk, from the others where events are many. */
function deviation(
  index: GroupCount,
  reference: GroupCount,
  ratio: number,
  shortfall: number,
): number {
  if (2 * index.events < index.total) {
    return index.events / index.total - ratio * (reference.events / reference.total);
  }
  const indexOthers = (index.total - index.events) / index.total;
  const referenceOthers = (reference.total - reference.events) / reference.total;
  return shortfall - (indexOthers - ratio * referenceOthers);
}

/** One less the constrained reference risk: root of the quadratic in that share. */
function constrainedReferenceOthers(
  table: FourfoldTable,
  ratio: number,
  shortfall: number,
): number {
  const { index, reference } = table;
  const square = (index.total + reference.total) * ratio;
  const linear =
    index.events + reference.total + (reference.events - index.total - 2 * reference.total) * ratio;
  const constant = cellsOf(table).referenceOthers * shortfall;
  const root = Math.sqrt(linear * linear + 4 * square * constant);
  return Math.min(
    1,
    linear > 0 ? (2 * constant) / (linear + root) : (root - linear) / (2 * square),
  );
}
