import type { FourfoldTable } from '../../fourfold-table';
import { standardised } from './standardised';

/**
 * The score statistic as a function of the logarithm of the tested risk ratio, decreasing in it.
 *
 * `factor` enlarges the variance: 1 for Koopman, N / (N - 1) for Miettinen and Nurminen.
 * Source: Koopman (1984) Biometrics 40:513-517; Miettinen and Nurminen (1985).
 */
export function riskRatioScore(table: FourfoldTable, factor: number): (logRatio: number) => number {
  const { index, reference } = table;
  const indexShare = index.events / index.total;
  const referenceShare = reference.events / reference.total;
  return (logRatio) => {
    const ratio = Math.exp(logRatio);
    const referenceRisk = constrainedReferenceRisk(table, ratio);
    const indexRisk = Math.min(1, ratio * referenceRisk);
    const variance =
      (indexRisk * (1 - indexRisk)) / index.total +
      (ratio * ratio * referenceRisk * (1 - referenceRisk)) / reference.total;
    return standardised(indexShare - ratio * referenceShare, variance * factor);
  };
}

/** Root of the likelihood's quadratic, in the form that does not cancel. */
function constrainedReferenceRisk({ index, reference }: FourfoldTable, ratio: number): number {
  const square = (index.total + reference.total) * ratio;
  const linear = index.total * ratio + index.events + reference.total + reference.events * ratio;
  const constant = index.events + reference.events;
  const discriminant = Math.max(0, linear * linear - 4 * square * constant);
  return Math.min(1, 1 / ratio, (2 * constant) / (linear + Math.sqrt(discriminant)));
}
