import type { Dependencies } from '../../dependencies';
import type { DataSet } from '../../models/data-set/data-set-store';
import { listCuts, type ListedCut } from '../cuts/list-cuts';

/** A data set with its cuts and the number of its newest code book. */
export interface ListedDataSet extends Pick<DataSet, 'id' | 'name'> {
  readonly cuts: readonly ListedCut[];
  readonly codeBookNumber: number;
}

/** The data sets of a study that have a cut, oldest first. */
export async function listDataSets(
  dependencies: Dependencies,
  studyId: string,
): Promise<readonly ListedDataSet[]> {
  const { dataSets, codeBooks } = dependencies.database.stores;
  const listed: ListedDataSet[] = [];
  for (const { id, name } of await dataSets.list(studyId)) {
    const codeBook = await codeBooks.newest(id);
    const cuts = await listCuts(dependencies, id);
    if (codeBook !== null) listed.push({ id, name, cuts, codeBookNumber: codeBook.number });
  }
  return listed;
}
