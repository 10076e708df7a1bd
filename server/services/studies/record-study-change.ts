import type { Dependencies } from '../../dependencies';
import type { Unit } from '../../models/unit-of-work';
import { timestamp } from '../../runtime/clock';
import { appendToTrail } from '../trail/append-to-trail';

/** A change of a study: who made it, what it was, the words before and after. */
export interface StudyChangeRecord {
  readonly studyId: string;
  readonly personId: string;
  readonly what: string;
  readonly before: unknown;
  readonly after: unknown;
}

/** Notes on the study that it changed just now, and appends the change to its trail. */
export async function recordStudyChange(
  dependencies: Dependencies,
  { studyId, ...change }: StudyChangeRecord,
  unit: Unit,
): Promise<void> {
  const updatedAt = timestamp(dependencies.clock);
  await dependencies.database.stores.studies.update(studyId, { updatedAt }, unit);
  await appendToTrail(dependencies, { chain: studyId, ...change }, unit);
}
