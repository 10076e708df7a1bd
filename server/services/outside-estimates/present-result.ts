import type { AnalysisResult } from '#shared/analysis';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';

/** The newest result of an analysis of a study. */
export async function presentResult(
  { database }: Dependencies,
  studyId: string,
  analysisId: string,
): Promise<Outcome<AnalysisResult>> {
  const { analyses, results } = database.stores;
  if ((await analyses.find(studyId, analysisId)) === null) return refuse('notFound');
  const newestId = await results.newestId(analysisId);
  const result = newestId === null ? null : await results.findById(newestId);
  if (result === null) throw new Error(`Analysis ${analysisId} has no result.`);
  return { ok: true, value: result.content };
}
