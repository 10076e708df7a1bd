import { success } from '#shared/core';
import type { Result } from '#shared/core';
import type { EstimationIssue } from '../../estimate';
import type { OddsRatioFit } from '../../fitted-odds-ratio';
import { fitOddsRatio } from '../../fitted-odds-ratio';
import type { StratifiedTable } from '../../fourfold-table';
import { pooledOddsRatio } from '../mantel-haenszel-ratios';

/** How far each stratum lies from its fit at the Mantel–Haenszel odds ratio. */
export function fitsAtCommonRatio(
  strata: StratifiedTable,
): Result<readonly OddsRatioFit[], EstimationIssue> {
  const pooled = pooledOddsRatio(strata, 0.95);
  if (!pooled.ok) {
    return pooled;
  }
  const logRatio = Math.log(pooled.value.value);
  return success(strata.map(({ table }) => fitOddsRatio(table, logRatio)));
}

/** Squared deviations over their variances, summed. */
export function breslowDayStatistic(fits: readonly OddsRatioFit[]): number {
  return fits.reduce((sum, fit) => sum + fit.deviation ** 2 / fit.variance, 0);
}
