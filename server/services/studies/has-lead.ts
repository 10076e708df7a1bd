import type { Dependencies } from '../../dependencies';
import type { Unit } from '../../models/unit-of-work';

/** Whether a study has a lead who can sign in, as the unit sees it. */
export async function hasLead(
  { database }: Dependencies,
  studyId: string,
  unit: Unit,
): Promise<boolean> {
  const members = await database.stores.memberships.ofStudy(studyId, unit);
  const leads = members.filter(({ role }) => role === 'lead').map(({ userId }) => userId);
  const people = await database.stores.users.findMany(leads, unit);
  return people.some(({ disabled }) => !disabled);
}
