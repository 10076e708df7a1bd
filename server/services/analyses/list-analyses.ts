import type { AnalysisSummary } from '#shared/api';
import type { Dependencies } from '../../dependencies';
import type { Analysis, AnalysisVersion } from '../../models/analysis/analysis-store';
import type { CutFacts } from '../../models/cut/cut-facts-store';
import { analysisUses, type AnalysisUse } from '../reports/block-usage';
import { analysisNumber } from '../reports/pinned-analyses';

/** The analyses of a study, by their numbers, with the reports that show them. */
export async function listAnalyses(
  dependencies: Dependencies,
  studyId: string,
): Promise<AnalysisSummary[]> {
  const { analyses, cutFacts } = dependencies.database.stores;
  const found = await analyses.list(studyId);
  const versions = await Promise.all(found.map(({ id, version }) => analyses.version(id, version)));
  const cuts = await cutFacts.of([...new Set(versions.map(({ cutId }) => cutId))]);
  const uses = await analysisUses(dependencies, studyId);
  return found.map((analysis, index) => {
    const version = versions[index];
    const cut = cuts.get(version?.cutId ?? '');
    if (version === undefined || cut === undefined) throw new Error('A cut is gone.');
    return summariseAnalysis(analysis, version, cut, uses.get(analysis.id) ?? []);
  });
}

/** An analysis as lists show it. */
export function summariseAnalysis(
  { id, number, version, updatedAt }: Analysis,
  { name, cutId }: AnalysisVersion,
  cut: CutFacts,
  usedIn: AnalysisUse,
): AnalysisSummary {
  const { number: cutNumber, dataSetId, dataSetName } = cut;
  const place = { cutId, cutNumber, dataSetId, dataSetName };
  return { id, number: analysisNumber(number), name, ...place, version, updatedAt, usedIn };
}
