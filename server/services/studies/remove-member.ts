import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { User } from '../../models/user/user-store';
import { hasLead } from './has-lead';
import { recordStudyChange } from './record-study-change';

/** Ends a membership; the last lead stays. */
export async function removeMember(
  dependencies: Dependencies,
  person: User,
  studyId: string,
  memberId: string,
): Promise<Outcome<undefined>> {
  const { database } = dependencies;
  return database.unitOfWork<Outcome<undefined>>(`study:${studyId}`, async (unit) => {
    const present = await database.stores.memberships.find(studyId, memberId, unit);
    if (present === null) return refuse('notFound');
    await database.stores.memberships.remove(studyId, memberId, unit);
    if (!(await hasLead(dependencies, studyId, unit))) return refuse('lastLead');
    const before = { person: memberId, role: present.role };
    const change = { studyId, personId: person.id, what: 'member.removed', before, after: null };
    await recordStudyChange(dependencies, change, unit);
    return { ok: true, value: undefined };
  });
}
