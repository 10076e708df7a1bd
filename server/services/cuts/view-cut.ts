import type { CutProfile } from '#shared/api';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import { listCuts, type ListedCut } from './list-cuts';

/** A cut with its data set and what its file held. */
export interface ViewedCut extends ListedCut {
  readonly dataSetId: string;
  readonly dataSetName: string;
  readonly profile: CutProfile;
}

/** A ready cut of a study. */
export async function viewCut(
  dependencies: Dependencies,
  studyId: string,
  cutId: string,
): Promise<Outcome<ViewedCut>> {
  const { cutFacts, cuts } = dependencies.database.stores;
  const facts = await cutFacts.findReady(studyId, cutId);
  if (facts === null) return refuse('notFound');
  const { dataSetId, dataSetName } = facts;
  const listed = (await listCuts(dependencies, dataSetId)).find(({ id }) => id === cutId);
  const cut = await cuts.findById(cutId);
  if (listed === undefined || cut === null) return refuse('notFound');
  return { ok: true, value: { ...listed, dataSetId, dataSetName, profile: cut.profile } };
}
