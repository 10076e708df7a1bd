import type { PinnedAnalysis, Report } from '#shared/report';
import type { Dependencies } from '../../dependencies';
import type { StoredResult } from '../../models/result/result-store';
import type { Unit } from '../../models/unit-of-work';

/** The analyses that a report pins, each with the result that it is shown with. */
export async function pinnedAnalyses(
  dependencies: Dependencies,
  report: Pick<Report, 'pins'>,
  unit?: Unit,
): Promise<readonly PinnedAnalysis[]> {
  const { results, cutFacts, outsideEstimates } = dependencies.database.stores;
  const found = await results.findMany(Object.values(report.pins), unit);
  const cuts = await cutFacts.of([...new Set(found.map(({ cutId }) => cutId))], unit);
  const estimates = await outsideEstimates.ofAnalyses(Object.keys(report.pins), unit);
  return Promise.all(
    found.map(async (result) => {
      const cut = cuts.get(result.cutId);
      if (cut === undefined) throw new Error(`The cut of result ${result.id} is gone.`);
      const { id, number, dataDate } = cut;
      const words = await wordsOf(dependencies, result, unit);
      const outside = estimates.filter(({ analysisId }) => analysisId === result.analysisId);
      return { ...words, cut: { id, number, dataDate }, result: result.content, outside };
    }),
  );
}

/** Number and name of the analysis, as they were when the result was made. */
async function wordsOf(
  { database }: Dependencies,
  { id, analysisId, analysisVersion }: StoredResult,
  unit?: Unit,
): Promise<Pick<PinnedAnalysis, 'analysisId' | 'number' | 'name' | 'resultId'>> {
  const { analyses } = database.stores;
  const { name } = await analyses.version(analysisId, analysisVersion, unit);
  const number = await analyses.numberOf(analysisId, unit);
  return { analysisId, number: analysisNumber(number), name, resultId: id };
}

/** "A2": how people speak of an analysis. */
export function analysisNumber(number: number): string {
  return `A${String(number)}`;
}
