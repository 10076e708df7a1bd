import type { EffectMeasureId } from '#shared/effects';
import { levelLabel } from '../bench/result-scopes';
import {
  type BenchPrint,
  type PrintedEstimate,
  printedEstimate,
  printedPValue,
} from './bench-print';

/** A pooled contrast with the tests of whether the strata differ. */
export interface PooledRow {
  readonly levelId: string;
  readonly label: string;
  readonly estimates: readonly PrintedEstimate[];
  readonly homogeneity: readonly PrintedEstimate[];
}

/** The pooled contrasts for the measures that are shown. */
export function pooledRows(
  print: BenchPrint,
  measures: readonly EffectMeasureId[],
): readonly PooledRow[] {
  return print.result.pooled.map((contrast) => ({
    levelId: contrast.indexLevelId,
    label: levelLabel(print.result, contrast.indexLevelId),
    estimates: measures.map((id) => printedEstimate(print, id, contrast.measures[id], undefined)),
    homogeneity: measures.map((id) => printedPValue(print, contrast.homogeneity[id])),
  }));
}
