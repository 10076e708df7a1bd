import type { PooledContrastResult } from '#shared/analysis';
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

const DIFFER_BELOW = 0.05;

/** What the tests of homogeneity allow to be said, carefully. */
export function homogeneityWords(
  pooled: readonly PooledContrastResult[],
  measures: readonly EffectMeasureId[],
): string {
  const pValues = pooled.flatMap(({ homogeneity }) =>
    measures.flatMap((id) => {
      const test = homogeneity[id];
      return test.ok ? [test.value.pValue] : [];
    }),
  );
  if (pValues.length === 0) return 'Whether the strata differ cannot be tested with these counts.';
  return pValues.some((pValue) => pValue < DIFFER_BELOW)
    ? 'The strata differ by more than chance is likely to bring. Read the strata, not the pooled number alone.'
    : 'No clear evidence that the strata differ; this test has little power. Read the strata first.';
}
