import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { CodeBookVersion } from '../../models/code-book/code-book-store';

/** The newest code book of a data set of a study. */
export async function viewCodeBook(
  { database }: Dependencies,
  studyId: string,
  dataSetId: string,
): Promise<Outcome<CodeBookVersion>> {
  const dataSet = await database.stores.dataSets.find(studyId, dataSetId);
  const newest = dataSet === null ? null : await database.stores.codeBooks.newest(dataSetId);
  return newest === null ? refuse('notFound') : { ok: true, value: newest };
}
