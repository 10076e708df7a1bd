import { fitOddsRatio } from '../../fitted-odds-ratio';
import type { FourfoldTable } from '../../fourfold-table';
import { standardised } from './standardised';

/**
 * The score statistic as a function of the logarithm of the tested odds ratio, decreasing in it.
 *
 * `factor` enlarges the variance: 1 for Cornfield, N / (N - 1) for Miettinen and Nurminen.
 * Source: Cornfield (1956); Miettinen and Nurminen (1985) Statistics in Medicine 4:213-226.
 */
export function oddsRatioScore(table: FourfoldTable, factor: number): (logRatio: number) => number {
  return (logRatio) => {
    const { deviation, variance } = fitOddsRatio(table, logRatio);
    return standardised(deviation, variance * factor);
  };
}
