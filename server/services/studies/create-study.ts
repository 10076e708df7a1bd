import type { NewStudyRequest } from '#shared/api';
import type { Dependencies } from '../../dependencies';
import type { Study } from '../../models/study/study-store';
import type { User } from '../../models/user/user-store';
import { timestamp } from '../../runtime/clock';
import { recordStudyChange } from './record-study-change';

/** Whether the data of a study are real or made up for demonstration. */
export type StudyOrigin = 'real' | 'invented';

/** Begins a study; whoever begins it is its lead. */
export async function createStudy(
  dependencies: Dependencies,
  person: User,
  request: NewStudyRequest,
  origin: StudyOrigin = 'real',
): Promise<Study> {
  const { database, clock, ids } = dependencies;
  const now = timestamp(clock);
  const state = { invented: origin === 'invented', createdAt: now, updatedAt: now };
  const study = { id: ids.next(), ...request, ...state };
  const membership = {
    studyId: study.id,
    userId: person.id,
    role: 'lead',
    createdAt: now,
  } as const;
  await database.unitOfWork(`study:${study.id}`, async (unit) => {
    await database.stores.studies.insert(study, unit);
    await database.stores.memberships.insert(membership, unit);
    const change = { studyId: study.id, personId: person.id, what: 'study.created' };
    await recordStudyChange(dependencies, { ...change, before: null, after: request }, unit);
  });
  return study;
}
