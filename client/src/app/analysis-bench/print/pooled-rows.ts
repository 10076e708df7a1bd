import { contrastTable, type PooledContrastResult } from '#shared/analysis';
import { EFFECT_MEASURES, type EffectMeasureId } from '#shared/effects';
import { DIFFERENCE_SCALES, formatNumber, withPercentSign } from '#shared/format';
import { fillWords } from '#shared/wording';
import { levelLabel } from '../bench/result-scopes';
import {
  type BenchPrint,
  estimateText,
  type PrintedEstimate,
  printedEstimate,
  printedPValue,
} from './bench-print';

/** A pooled contrast with the tests of whether the strata differ. */
export interface PooledRow {
  readonly levelId: string;
  readonly label: string;
  readonly estimates: readonly PrintedEstimate[];
  /** The crude estimate beside each, and how far the pooled one is from it; null without both. */
  readonly crude: readonly (CrudeBeside | null)[];
  readonly homogeneity: readonly PrintedEstimate[];
}

/** A crude estimate, and the pooled one less it (a difference) or over it (a ratio). */
export interface CrudeBeside {
  readonly value: string;
  readonly shift: string;
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
    crude: measures.map((id) => crudeBeside(print, id, contrast)),
    homogeneity: measures.map((id) => printedPValue(print, contrast.homogeneity[id])),
  }));
}

function crudeBeside(
  print: BenchPrint,
  measure: EffectMeasureId,
  { indexLevelId, measures }: PooledContrastResult,
): CrudeBeside | null {
  const { crude } = print.result;
  const contrast = crude.contrasts.find((each) => each.indexLevelId === indexLevelId);
  const [over, within] = [contrast?.measures[measure], measures[measure]];
  if (over?.ok !== true || !within.ok) return null;
  const table = contrastTable(crude, indexLevelId);
  const value = estimateText(print, measure, over.value, table).value.text;
  return { value, shift: shiftWords(print, measure, within.value.value, over.value.value) };
}

function shiftWords(
  { style, decimals, book }: BenchPrint,
  measure: EffectMeasureId,
  pooled: number,
  crude: number,
): string {
  if (EFFECT_MEASURES[measure].scale === 'ratio') {
    const form = { scale: 100, decimals: 0, sign: 'plusAndMinus' } as const;
    const share = formatNumber({ kind: 'real', value: pooled / crude - 1 }, form, style).text;
    return withPercentSign(share, style);
  }
  const { unit } = style.difference;
  const { scale } = DIFFERENCE_SCALES[unit];
  const form = { scale, decimals: decimals.riskDifference, sign: 'plusAndMinus' } as const;
  const size = formatNumber({ kind: 'real', value: pooled - crude }, form, style).text;
  return fillWords(book, `size.${unit}`, { size });
}
