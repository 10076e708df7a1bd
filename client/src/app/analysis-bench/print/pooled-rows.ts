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

/** Why tests of homogeneity have no p-value: each reason once, with its levels. */
export function untestedWords(rows: readonly PooledRow[]): readonly string[] {
  const reasons = rows.flatMap(({ label, homogeneity }) =>
    homogeneity.flatMap((test) => (test.ok ? [] : [{ label, reason: test.reason }])),
  );
  return [...new Set(reasons.map(({ reason }) => reason))].map((reason) => {
    const labels = reasons.filter((each) => each.reason === reason).map(({ label }) => label);
    return `Not tested for ${[...new Set(labels)].join(', ')}: ${reason}`;
  });
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
