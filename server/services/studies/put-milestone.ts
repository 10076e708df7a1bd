import type { Milestone } from '#shared/api';
import type { Dependencies } from '../../dependencies';
import { refuseField, type Outcome } from '../../errors/server-issue';
import type { User } from '../../models/user/user-store';
import { recordStudyChange } from './record-study-change';

/** Adds a milestone to a study, or changes it. The id in the address and the body agree. */
export async function putMilestone(
  dependencies: Dependencies,
  person: User,
  studyId: string,
  milestoneId: string,
  milestone: Milestone,
): Promise<Outcome<undefined>> {
  if (milestone.id !== milestoneId) return refuseField('id', 'This must be the id in the address.');
  const { database } = dependencies;
  await database.unitOfWork(`study:${studyId}`, async (unit) => {
    const before = await database.stores.milestones.find(studyId, milestoneId, unit);
    if (before?.title === milestone.title && before.dueDate === milestone.dueDate) return;
    await database.stores.milestones.put({ studyId, ...milestone }, unit);
    const what = before === null ? 'milestone.added' : 'milestone.changed';
    const change = { studyId, personId: person.id, what, before, after: milestone };
    await recordStudyChange(dependencies, change, unit);
  });
  return { ok: true, value: undefined };
}
