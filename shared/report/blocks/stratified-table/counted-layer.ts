import type { ContrastResult, LayerResult, PooledContrastResult } from '#shared/analysis';
import type { AnalysisResult, ResultScope } from '#shared/analysis';
import { layerAt } from '#shared/analysis';

/** A layer with what its cells are made of; pooled estimates stand beside the counts of all. */
export interface CountedLayer {
  readonly scope: ResultScope;
  readonly counts: LayerResult;
  readonly contrasts: readonly (ContrastResult | PooledContrastResult)[];
}

/** The counts and contrasts at a scope of a result. */
export function countedLayer(result: AnalysisResult, scope: ResultScope): CountedLayer {
  const counts = layerAt(result, scope) ?? result.crude;
  const contrasts = scope.kind === 'pooled' ? result.pooled : counts.contrasts;
  return { scope, counts, contrasts };
}
