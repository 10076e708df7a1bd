import { analysisIdsOf, type Block } from '#shared/report';
import type { AnalysisSummary } from '#shared/api';
import type { Dependencies } from '../../dependencies';
import type { Unit } from '../../models/unit-of-work';

/** The reports that show an analysis, each with how many of its blocks do. */
export type AnalysisUse = AnalysisSummary['usedIn'];

/** Where each analysis of a study is shown, by its id; what was removed does not count. */
export async function analysisUses(
  { database }: Dependencies,
  studyId: string,
  unit?: Unit,
): Promise<ReadonlyMap<string, AnalysisUse>> {
  const { reports, blocks } = database.stores;
  const titles = new Map((await reports.list(studyId, unit)).map(({ id, title }) => [id, title]));
  const stored = await blocks.of([...titles.keys()], unit);
  const uses = new Map<string, AnalysisUse>();
  for (const [reportId, title] of titles) {
    const ofReport = stored.filter((block) => block.reportId === reportId);
    for (const [analysisId, count] of countShown(ofReport)) {
      const known = uses.get(analysisId) ?? [];
      uses.set(analysisId, [...known, { reportId, title, blocks: count }]);
    }
  }
  return uses;
}

function countShown(blocks: readonly Block[]): ReadonlyMap<string, number> {
  const counts = new Map<string, number>();
  const shown = blocks.filter(({ removedAt }) => removedAt === null).flatMap(analysisIdsOf);
  for (const id of shown) counts.set(id, (counts.get(id) ?? 0) + 1);
  return counts;
}
