import type { AnalysisView } from '#shared/api';
import type { PinnedAnalysis } from '#shared/report';

/** An analysis as a report shows it before the server has pinned its result. */
export function pinnedAnalysisOf(view: AnalysisView): PinnedAnalysis {
  return {
    analysisId: view.id,
    number: view.number,
    name: view.name,
    resultId: view.resultId,
    cut: { id: view.cutId, number: view.cutNumber, dataDate: view.cutDataDate },
    result: view.result,
    outside: view.outside ?? [],
  };
}
