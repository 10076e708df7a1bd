import type { CutSummary } from '#shared/api';
import type { Dependencies } from '../../dependencies';

/** A cut as lists show it. */
export type ListedCut = Readonly<CutSummary>;

/** The ready cuts of a data set, oldest first, with the names of who stored them. */
export async function listCuts(
  { database }: Dependencies,
  dataSetId: string,
): Promise<readonly ListedCut[]> {
  const cuts = await database.stores.cuts.listReady(dataSetId);
  const people = await database.stores.users.findMany(cuts.map(({ createdBy }) => createdBy));
  const names = new Map(people.map(({ id, name }) => [id, name]));
  return cuts.map(({ id, number, dataDate, fileName, rows, sha256, createdAt, createdBy }) => ({
    id,
    number,
    dataDate,
    fileName,
    rows,
    sha256,
    createdAt,
    createdBy: names.get(createdBy) ?? '',
  }));
}
