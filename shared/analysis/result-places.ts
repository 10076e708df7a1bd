import type { FourfoldTable, StratifiedTable } from '#shared/stats';
import type { AnalysisResult, LayerResult, PooledContrastResult } from './analysis-result';
import type { ResultScope } from './value-address';

/** The layer of a scope; undefined for the pooled scope and for a stratum that is not there. */
export function layerAt(result: AnalysisResult, scope: ResultScope): LayerResult | undefined {
  switch (scope.kind) {
    case 'crude':
      return result.crude;
    case 'stratum':
      return result.strata.find(({ stratumId }) => stratumId === scope.stratumId);
    case 'pooled':
      return undefined;
  }
}

/** The pooled contrast of a level against the reference, if there is one. */
export function pooledAt(
  result: AnalysisResult,
  levelId: string | null,
): PooledContrastResult | undefined {
  return result.pooled.find(({ indexLevelId }) => indexLevelId === levelId);
}

/** The counts of a level and of the reference in a layer. */
export function contrastTable(
  layer: LayerResult | undefined,
  indexLevelId: string | null,
): FourfoldTable | undefined {
  const contrast = layer?.contrasts.find((candidate) => candidate.indexLevelId === indexLevelId);
  const countAt = (id: string | undefined): LayerResult['levels'][number] | undefined =>
    layer?.levels.find(({ levelId }) => levelId === id);
  const index = countAt(contrast?.indexLevelId);
  const reference = countAt(contrast?.referenceLevelId);
  return index && reference && { index: index.count, reference: reference.count };
}

/**
 * The tables of a contrast by stratum, with what standardisation asks of a stratum: its members in
 * the whole analysis, and its share in a chosen standard population.
 */
export function contrastStrata(
  { specification, strata }: Pick<AnalysisResult, 'specification' | 'strata'>,
  indexLevelId: string,
): StratifiedTable {
  const shares = specification.otherMethods?.standardShares;
  return strata.flatMap((layer) => {
    const { stratumId: id, total } = layer;
    const table = contrastTable(layer, indexLevelId);
    if (id === null || table === undefined) {
      return [];
    }
    const share = shares?.[id];
    return [{ id, table, members: total.total, ...(share === undefined ? {} : { share }) }];
  });
}
