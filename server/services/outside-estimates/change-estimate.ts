import type { OutsideEstimateChangeRequest } from '#shared/api';
import type { OutsideEstimate } from '#shared/outside-estimates';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { User } from '../../models/user/user-store';
import { timestamp } from '../../runtime/clock';
import { recordStudyChange } from '../studies/record-study-change';
import type { EstimatePlace } from './add-estimates';
import { checkEntry } from './check-entry';
import { presentResult } from './present-result';

/** Changes an estimate, unless somebody changed it since the version it was made from. */
export async function changeEstimate(
  dependencies: Dependencies,
  person: User,
  place: EstimatePlace & { readonly id: string },
  { baseVersion, ...entry }: OutsideEstimateChangeRequest,
): Promise<Outcome<OutsideEstimate>> {
  const result = await presentResult(dependencies, place.studyId, place.analysisId);
  if (!result.ok) return result;
  const { unitOfWork, stores } = dependencies.database;
  return unitOfWork<Outcome<OutsideEstimate>>(`study:${place.studyId}`, async (unit) => {
    const before = await stores.outsideEstimates.find(place, unit);
    if (before === null) return refuse('notFound');
    const facts = { version: before.version };
    if (before.version !== baseVersion) return refuse('staleOutsideEstimate', { facts });
    const checked = checkEntry(dependencies, entry, result.value);
    if (!checked.ok) return checked;
    const after: OutsideEstimate = { ...entry, ...place, version: baseVersion + 1 };
    const row = { entry, version: after.version, updatedAt: timestamp(dependencies.clock) };
    const written = { ...row, personId: person.id };
    await stores.outsideEstimates.update(place.id, baseVersion, written, unit);
    const record = { studyId: place.studyId, personId: person.id, before, after };
    await recordStudyChange(dependencies, { ...record, what: 'outsideEstimate.changed' }, unit);
    return { ok: true, value: after };
  });
}
