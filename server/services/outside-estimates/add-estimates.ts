import type { OutsideEstimate, OutsideEstimateEntry } from '#shared/outside-estimates';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { Unit } from '../../models/unit-of-work';
import type { User } from '../../models/user/user-store';
import { timestamp } from '../../runtime/clock';
import { recordStudyChange } from '../studies/record-study-change';
import { checkEntry } from './check-entry';
import { presentResult } from './present-result';

/** Where estimates go. */
export interface EstimatePlace {
  readonly studyId: string;
  readonly analysisId: string;
}

/** Puts an estimate beside an analysis; its numbers are checked first. */
export async function addEstimate(
  dependencies: Dependencies,
  person: User,
  place: EstimatePlace,
  entry: OutsideEstimateEntry,
): Promise<Outcome<OutsideEstimate>> {
  const result = await presentResult(dependencies, place.studyId, place.analysisId);
  if (!result.ok) return result;
  const checked = checkEntry(dependencies, entry, result.value);
  if (!checked.ok) return checked;
  const added = await addEstimates(dependencies, person, place, [entry]);
  if (!added.ok) return added;
  const [only] = added.value;
  if (only === undefined) throw new Error('An added estimate is gone.');
  return { ok: true, value: only };
}

/** Puts checked estimates beside an analysis, all or none. */
export async function addEstimates(
  dependencies: Dependencies,
  person: User,
  place: EstimatePlace,
  entries: readonly OutsideEstimateEntry[],
): Promise<Outcome<readonly OutsideEstimate[]>> {
  const { unitOfWork, stores } = dependencies.database;
  const { studyId, analysisId } = place;
  return unitOfWork<Outcome<readonly OutsideEstimate[]>>(`study:${studyId}`, async (unit) => {
    if ((await stores.analyses.find(studyId, analysisId, unit)) === null) return refuse('notFound');
    const added: OutsideEstimate[] = [];
    for (const entry of entries) {
      added.push(await insert(dependencies, person, place, entry, unit));
    }
    return { ok: true, value: added };
  });
}

async function insert(
  dependencies: Dependencies,
  person: User,
  place: EstimatePlace,
  entry: OutsideEstimateEntry,
  unit: Unit,
): Promise<OutsideEstimate> {
  const { ids, clock, database } = dependencies;
  const [id, now] = [ids.next(), timestamp(clock)];
  const times = { createdAt: now, updatedAt: now };
  const row = { id, ...place, version: 1, entry, personId: person.id, ...times };
  await database.stores.outsideEstimates.insert(row, unit);
  const estimate = { ...entry, id, ...place, version: 1 };
  const record = { studyId: place.studyId, personId: person.id, what: 'outsideEstimate.added' };
  await recordStudyChange(dependencies, { ...record, before: null, after: estimate }, unit);
  return estimate;
}
