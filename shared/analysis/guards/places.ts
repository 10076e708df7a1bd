import type { AnalysisResult, LayerResult } from '../analysis-result';
import type { ResultScope } from '../value-address';
import type { GuardPlace } from './guard';

/** The place of findings about the analysis as a whole. */
export const WHOLE: GuardPlace = { scope: { kind: 'crude' }, levelId: null };

/** The scope of a layer. */
export function scopeOf({ stratumId }: LayerResult): ResultScope {
  return stratumId === null ? { kind: 'crude' } : { kind: 'stratum', stratumId };
}

/** The crude layer, then the strata. */
export function layersOf(result: AnalysisResult): readonly LayerResult[] {
  return [result.crude, ...result.strata];
}
