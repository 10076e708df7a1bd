import type { StudyRole } from '#shared/permissions';
import type { Dependencies } from '../../dependencies';
import type { Study } from '../../models/study/study-store';

/** A study, and the role that somebody has on it. */
export interface MembershipOnStudy {
  readonly study: Study;
  readonly role: StudyRole;
}

/** A person's membership, or null: no such study, or not theirs (nobody can tell which). */
export async function findMembership(
  { database }: Dependencies,
  personId: string,
  studyId: string,
): Promise<MembershipOnStudy | null> {
  const membership = await database.stores.memberships.find(studyId, personId);
  const study = membership === null ? null : await database.stores.studies.findById(studyId);
  return membership === null || study === null ? null : { study, role: membership.role };
}
