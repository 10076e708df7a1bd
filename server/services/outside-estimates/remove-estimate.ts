import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { User } from '../../models/user/user-store';
import { timestamp } from '../../runtime/clock';
import { recordStudyChange } from '../studies/record-study-change';
import type { EstimatePlace } from './add-estimates';

/** Removes an estimate; what it was stays in the trail. */
export async function removeEstimate(
  dependencies: Dependencies,
  person: User,
  place: EstimatePlace & { readonly id: string },
): Promise<Outcome<undefined>> {
  const { unitOfWork, stores } = dependencies.database;
  return unitOfWork<Outcome<undefined>>(`study:${place.studyId}`, async (unit) => {
    const before = await stores.outsideEstimates.find(place, unit);
    if (before === null) return refuse('notFound');
    await stores.outsideEstimates.remove(place.id, timestamp(dependencies.clock), unit);
    const record = { studyId: place.studyId, personId: person.id, before, after: null };
    await recordStudyChange(dependencies, { ...record, what: 'outsideEstimate.removed' }, unit);
    return { ok: true, value: undefined };
  });
}
