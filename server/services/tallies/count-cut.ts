import type { Tally, TallyRequest } from '#shared/tally';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import { countRecords } from './count-records';

/** Counts a cut of a study under the newest code book of its data set. */
export async function countCut(
  dependencies: Dependencies,
  studyId: string,
  cutId: string,
  request: TallyRequest,
): Promise<Outcome<Tally>> {
  const { cutFacts, codeBooks } = dependencies.database.stores;
  const cut = await cutFacts.findReady(studyId, cutId);
  const codeBook = cut === null ? null : await codeBooks.newest(cut.dataSetId);
  if (codeBook === null) return refuse('notFound');
  return countRecords(dependencies, cutId, codeBook.content, request);
}
