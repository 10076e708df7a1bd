import type { CodeBook } from '#shared/code-book';
import type { Dependencies } from '../../dependencies';
import type { Unit } from '../../models/unit-of-work';
import { timestamp } from '../../runtime/clock';

/** What a new version of a code book says, and who made it. */
export interface NewCodeBook {
  readonly dataSetId: string;
  readonly number: number;
  readonly content: CodeBook;
  readonly createdBy: string;
}

/** Adds a version of a code book; gives its id. */
export async function addCodeBook(
  { database, ids, clock }: Dependencies,
  version: NewCodeBook,
  unit: Unit,
): Promise<string> {
  const id = ids.next();
  const createdAt = timestamp(clock);
  await database.stores.codeBooks.insert({ id, ...version, createdAt }, unit);
  return id;
}
