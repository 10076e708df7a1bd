import { type AnalysisResult, findGuards, type LayerResult } from '#shared/analysis';

/** Whether a level of a layer has a cell with a small expected count, as its guard says. */
export function isSparse(result: AnalysisResult, layer: LayerResult, levelId: string): boolean {
  return sparseLevels(result).has(placeKey(layer.stratumId, levelId));
}

const known = new WeakMap<AnalysisResult, ReadonlySet<string>>();

function sparseLevels(result: AnalysisResult): ReadonlySet<string> {
  const found = known.get(result) ?? findSparseLevels(result);
  known.set(result, found);
  return found;
}

function findSparseLevels(result: AnalysisResult): ReadonlySet<string> {
  const places = findGuards(result)
    .filter(({ guardId }) => guardId === 'sparseCells')
    .flatMap(({ place, facts }) => {
      const stratumId = place.scope.kind === 'stratum' ? place.scope.stratumId : null;
      const levelIds = Array.isArray(facts.levelIds) ? facts.levelIds : [];
      return levelIds.map((levelId) => placeKey(stratumId, String(levelId)));
    });
  return new Set(places);
}

function placeKey(stratumId: string | null, levelId: string): string {
  return JSON.stringify([stratumId, levelId]);
}
