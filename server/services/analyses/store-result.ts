import type { Dependencies } from '../../dependencies';
import type { ResultKey } from '../../models/result/result-store';
import type { Unit } from '../../models/unit-of-work';
import { timestamp } from '../../runtime/clock';
import type { ComputedResult } from './compute-result';

/** Stores a computed result of a version of an analysis, unless it is there; gives its id. */
export async function storeResult(
  { database, ids, clock }: Dependencies,
  analysis: Pick<ResultKey, 'analysisId' | 'analysisVersion'>,
  { cut, codeBook, engineVersion, content }: ComputedResult,
  unit: Unit,
): Promise<string> {
  const key = { ...analysis, cutId: cut.id, codeBookId: codeBook.id, engineVersion };
  const known = await database.stores.results.findByKey(key, unit);
  if (known !== null) return known.id;
  const id = ids.next();
  const result = { id, ...key, content, createdAt: timestamp(clock) };
  await database.stores.results.insert(result, unit);
  return id;
}

/** Whether the code book that a result was counted under is still the newest of its data set. */
export async function isCurrent(
  { database }: Dependencies,
  { cut, codeBook }: ComputedResult,
  unit: Unit,
): Promise<boolean> {
  return (await database.stores.codeBooks.newest(cut.dataSetId, unit))?.id === codeBook.id;
}
