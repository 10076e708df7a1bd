import type { StudyRole } from '#shared/permissions';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { User } from '../../models/user/user-store';
import { hasLead } from './has-lead';
import { recordStudyChange } from './record-study-change';

/** Gives a member another role; the last lead stays one. */
export async function changeMember(
  dependencies: Dependencies,
  person: User,
  studyId: string,
  memberId: string,
  role: StudyRole,
): Promise<Outcome<undefined>> {
  const { database } = dependencies;
  return database.unitOfWork<Outcome<undefined>>(`study:${studyId}`, async (unit) => {
    const present = await database.stores.memberships.find(studyId, memberId, unit);
    if (present === null) return refuse('notFound');
    if (present.role === role) return { ok: true, value: undefined };
    await database.stores.memberships.setRole(studyId, memberId, role, unit);
    if (!(await hasLead(dependencies, studyId, unit))) return refuse('lastLead');
    const before = { person: memberId, role: present.role };
    const change = { studyId, personId: person.id, what: 'member.roleChanged', before };
    await recordStudyChange(dependencies, { ...change, after: { person: memberId, role } }, unit);
    return { ok: true, value: undefined };
  });
}
