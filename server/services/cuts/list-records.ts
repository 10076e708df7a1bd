import type { Records, RecordsWindow } from '../../counting/counting-engine';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';

/** A window of the records of a cut; who may see single records is the route's to say. */
export async function listRecords(
  { database, counting }: Dependencies,
  studyId: string,
  cutId: string,
  window: RecordsWindow,
): Promise<Outcome<Records>> {
  if ((await database.stores.cutFacts.findReady(studyId, cutId)) === null) {
    return refuse('notFound');
  }
  return { ok: true, value: await counting.records(cutId, window) };
}
