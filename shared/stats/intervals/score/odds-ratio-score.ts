import type { FourfoldTable } from '../../fourfold-table';
import { standardised } from './standardised';

/**
 * The score statistic as a function of the logarithm of the tested odds ratio, decreasing in it.
 *
 * `factor` enlarges the variance: 1 for Cornfield, N / (N - 1) for Miettinen and Nurminen.
 * Source: Cornfield (1956); Miettinen and Nurminen (1985) Statistics in Medicine 4:213-226.
 */
export function oddsRatioScore(table: FourfoldTable, factor: number): (logRatio: number) => number {
  const { index, reference } = table;
  return (logRatio) => {
    const ratio = Math.exp(logRatio);
    const referenceRisk = constrainedReferenceRisk(table, ratio);
    const indexRisk = (ratio * referenceRisk) / (1 + referenceRisk * (ratio - 1));
    const precision =
      1 / (index.total * indexRisk * (1 - indexRisk)) +
      1 / (reference.total * referenceRisk * (1 - referenceRisk));
    return standardised(index.events - index.total * indexRisk, factor / precision);
  };
}

/** Root of the likelihood's quadratic, in the form that does not cancel. */
function constrainedReferenceRisk({ index, reference }: FourfoldTable, ratio: number): number {
  const events = index.events + reference.events;
  const square = reference.total * (ratio - 1);
  const linear = index.total * ratio + reference.total - events * (ratio - 1);
  const root = Math.sqrt(Math.max(0, linear * linear + 4 * square * events));
  return linear > 0 ? (2 * events) / (linear + root) : (root - linear) / (2 * square);
}
