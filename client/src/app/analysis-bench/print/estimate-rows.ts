import { contrastTable, layerAt, pooledAt, type ResultScope } from '#shared/analysis';
import type { EffectMeasureId } from '#shared/effects';
import type { FourfoldTable } from '#shared/stats';
import { type Balance, balanceOf, claimOf } from '#shared/wording';
import { type BenchPrint, type PrintedEstimate, printedEstimate } from './bench-print';

/** One level against the reference within a layer. */
export interface EstimateRow {
  readonly levelId: string;
  readonly label: string;
  readonly measures: Readonly<Record<EffectMeasureId, PrintedEstimate>>;
  /** Both sizes with what their gauge draws; null where nothing can be drawn. */
  readonly balance: Balance | null;
}

/** The contrasts of a layer, or the pooled ones, in the order of the levels. */
export function estimateRows(
  print: BenchPrint,
  scope: ResultScope,
  analysisId: string,
): readonly EstimateRow[] {
  const { frame } = print.result;
  return frame.exposure.levels
    .filter(({ id }) => id !== frame.exposure.referenceLevelId)
    .map(({ id, label }) => ({
      levelId: id,
      label,
      measures: printedMeasures(print, scope, id),
      balance: balanceAt(print, { analysisId, indexLevelId: id, scope }),
    }));
}

/** Both sizes of one contrast; null where the result has no such contrast. */
export function balanceAt(
  { result, style, book }: BenchPrint,
  target: Parameters<typeof claimOf>[1],
): Balance | null {
  const claim = claimOf(result, target);
  return claim.ok ? balanceOf(claim.value, style, book) : null;
}

function printedMeasures(
  print: BenchPrint,
  scope: ResultScope,
  levelId: string,
): EstimateRow['measures'] {
  const layer = layerAt(print.result, scope);
  const contrast =
    scope.kind === 'pooled'
      ? pooledAt(print.result, levelId)
      : layer?.contrasts.find(({ indexLevelId }) => indexLevelId === levelId);
  const table = contrastTable(layer, levelId);
  const printed = (id: EffectMeasureId): PrintedEstimate =>
    contrast === undefined
      ? { ok: false, reason: 'Not there.' }
      : printedEstimate(print, id, contrast.measures[id], table);
  return {
    riskDifference: printed('riskDifference'),
    riskRatio: printed('riskRatio'),
    oddsRatio: printed('oddsRatio'),
  };
}

/** The fourfold table behind a contrast; a pooled contrast has none of its own. */
export function tableAt(
  { result }: BenchPrint,
  scope: ResultScope,
  levelId: string | null,
): FourfoldTable | undefined {
  return contrastTable(layerAt(result, scope), levelId);
}
