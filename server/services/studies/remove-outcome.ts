import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome as Answer } from '../../errors/server-issue';
import type { User } from '../../models/user/user-store';
import { recordStudyChange } from './record-study-change';
import { presentOutcome } from './view-study';

/** Removes an outcome that no analysis counts. */
export async function removeOutcome(
  dependencies: Dependencies,
  person: User,
  studyId: string,
  outcomeId: string,
): Promise<Answer<undefined>> {
  const { database } = dependencies;
  const { outcomes } = database.stores;
  return database.unitOfWork<Answer<undefined>>(`study:${studyId}`, async (unit) => {
    const stored = await outcomes.find(studyId, outcomeId, unit);
    if (stored === null) return refuse('notFound');
    const analyses = await outcomes.analysesThatUse(studyId, outcomeId, unit);
    if (analyses.length > 0) return refuse('outcomeInUse', { facts: { analyses } });
    await outcomes.remove(studyId, outcomeId, unit);
    const change = { studyId, personId: person.id, what: 'outcome.removed' };
    const before = presentOutcome(stored);
    await recordStudyChange(dependencies, { ...change, before, after: null }, unit);
    return { ok: true, value: undefined };
  });
}
