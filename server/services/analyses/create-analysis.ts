import type { NewAnalysisRequest } from '#shared/api';
import type { Dependencies } from '../../dependencies';
import type { Outcome } from '../../errors/server-issue';
import type { Study } from '../../models/study/study-store';
import type { Unit } from '../../models/unit-of-work';
import type { User } from '../../models/user/user-store';
import { timestamp } from '../../runtime/clock';
import { recordStudyChange } from '../studies/record-study-change';
import { type ComputedResult, computeResult } from './compute-result';
import { isCurrent, storeResult } from './store-result';

/** Defines an analysis, computes it and stores its result; gives its id. */
export async function createAnalysis(
  dependencies: Dependencies,
  person: User,
  study: Study,
  request: NewAnalysisRequest,
): Promise<Outcome<string>> {
  const computed = await computeResult(dependencies, study, request);
  if (!computed.ok) return computed;
  const stored = await dependencies.database.unitOfWork(`study:${study.id}`, async (unit) =>
    (await isCurrent(dependencies, computed.value, unit))
      ? store(dependencies, person, study.id, request, computed.value, unit)
      : null,
  );
  if (stored === null) return createAnalysis(dependencies, person, study, request);
  return { ok: true, value: stored };
}

async function store(
  dependencies: Dependencies,
  person: User,
  studyId: string,
  { name, cutId, specification }: NewAnalysisRequest,
  computed: ComputedResult,
  unit: Unit,
): Promise<string> {
  const { ids, clock, database } = dependencies;
  const { analyses } = database.stores;
  const [id, now] = [ids.next(), timestamp(clock)];
  const number = await analyses.nextNumber(studyId, unit);
  const times = { createdAt: now, updatedAt: now, removedAt: null };
  await analyses.insert({ id, studyId, number, name, version: 1, ...times }, unit);
  const first = { analysisId: id, number: 1, name, cutId, specification };
  await analyses.insertVersion({ ...first, reason: null, personId: person.id, at: now }, unit);
  await storeResult(dependencies, { analysisId: id, analysisVersion: 1 }, computed, unit);
  const record = { studyId, personId: person.id, what: 'analysis.created', before: null };
  await recordStudyChange(dependencies, { ...record, after: { analysis: id, name } }, unit);
  return id;
}
