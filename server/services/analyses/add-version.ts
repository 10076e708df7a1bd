import type { Dependencies } from '../../dependencies';
import type { Analysis, AnalysisVersion } from '../../models/analysis/analysis-store';
import type { Unit } from '../../models/unit-of-work';
import { timestamp } from '../../runtime/clock';
import { movePins } from '../reports/move-pins';
import { recordStudyChange } from '../studies/record-study-change';
import type { ComputedResult } from './compute-result';
import { storeResult } from './store-result';

/** What a new version of an analysis says. */
export type VersionWords = Pick<
  AnalysisVersion,
  'name' | 'cutId' | 'specification' | 'reason' | 'personId'
>;

/** Adds a version of an analysis with its result, and moves the pins of drafts to it. */
export async function addVersion(
  dependencies: Dependencies,
  analysis: Analysis,
  words: VersionWords,
  computed: ComputedResult,
  unit: Unit,
): Promise<void> {
  const { analyses } = dependencies.database.stores;
  const { id: analysisId, studyId } = analysis;
  const [version, now] = [analysis.version + 1, timestamp(dependencies.clock)];
  await analyses.insertVersion({ ...words, analysisId, number: version, at: now }, unit);
  const change = { name: words.name, version, updatedAt: now };
  const updated = await analyses.update(analysisId, analysis.version, change, unit);
  if (!updated) throw new Error(`Analysis ${analysisId} changed within a unit of work.`);
  const key = { analysisId, analysisVersion: version };
  const resultId = await storeResult(dependencies, key, computed, unit);
  const { personId, reason } = words;
  await movePins(dependencies, { studyId, analysisId, resultId, personId }, unit);
  const record = { studyId, personId, what: 'analysis.changed' };
  const before = { analysis: analysisId, version: analysis.version };
  const after = { analysis: analysisId, version, reason };
  await recordStudyChange(dependencies, { ...record, before, after }, unit);
}
