import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { User } from '../../models/user/user-store';
import { recordStudyChange } from './record-study-change';

/** Removes a milestone of a study. */
export async function removeMilestone(
  dependencies: Dependencies,
  person: User,
  studyId: string,
  milestoneId: string,
): Promise<Outcome<undefined>> {
  const { database } = dependencies;
  return database.unitOfWork<Outcome<undefined>>(`study:${studyId}`, async (unit) => {
    const before = await database.stores.milestones.find(studyId, milestoneId, unit);
    if (before === null) return refuse('notFound');
    await database.stores.milestones.remove(studyId, milestoneId, unit);
    const change = { studyId, personId: person.id, what: 'milestone.removed' };
    await recordStudyChange(dependencies, { ...change, before, after: null }, unit);
    return { ok: true, value: undefined };
  });
}
