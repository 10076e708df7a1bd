import type { OutsideEstimate } from '#shared/outside-estimates';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { EstimatePlace } from './add-estimates';

/** The estimates beside an analysis of a study, in the order in which they were entered. */
export async function listEstimates(
  { database }: Dependencies,
  { studyId, analysisId }: EstimatePlace,
): Promise<Outcome<readonly OutsideEstimate[]>> {
  const { analyses, outsideEstimates } = database.stores;
  if ((await analyses.find(studyId, analysisId)) === null) return refuse('notFound');
  return { ok: true, value: await outsideEstimates.ofAnalyses([analysisId]) };
}
