import { type AnalysisResult, type ResultScope, scopeKey } from '#shared/analysis';

/** The layers of a result in the order of their tabs: all records, each stratum, pooled. */
export function scopesOf(result: AnalysisResult): readonly ResultScope[] {
  return [
    { kind: 'crude' },
    ...result.frame.strata.map(({ id }) => ({ kind: 'stratum' as const, stratumId: id })),
    ...(result.pooled.length > 0 ? [{ kind: 'pooled' as const }] : []),
  ];
}

/** Whether two scopes are the same layer. */
export function sameScope(one: ResultScope, other: ResultScope): boolean {
  return scopeKey(one) === scopeKey(other);
}

/** The scope's name on a tab. */
export function scopeLabel(result: AnalysisResult, scope: ResultScope): string {
  switch (scope.kind) {
    case 'crude':
      return result.frame.strata.length === 0 ? 'All records' : 'All, crude';
    case 'pooled':
      return 'Pooled';
    case 'stratum':
      return stratumLabel(result, scope.stratumId);
  }
}

/** The name of a layer: its stratum's label, or all records. */
export function layerName(result: AnalysisResult, stratumId: string | null): string {
  return stratumId === null ? 'All records' : stratumLabel(result, stratumId);
}

/** A stratum's label. */
export function stratumLabel(result: AnalysisResult, stratumId: string): string {
  return result.frame.strata.find(({ id }) => id === stratumId)?.label ?? stratumId;
}

/** An exposure level's label. */
export function levelLabel(result: AnalysisResult, levelId: string | null): string {
  return result.frame.exposure.levels.find(({ id }) => id === levelId)?.label ?? levelId ?? '';
}

/** The contrast of a level with the reference: "6 h or more against None". */
export function contrastLabel(result: AnalysisResult, levelId: string | null): string {
  const { referenceLevelId } = result.frame.exposure;
  return `${levelLabel(result, levelId)} against ${levelLabel(result, referenceLevelId)}`;
}
