import { columnIdsFor, COUNTED_OUTCOME_COLUMN_ID, type CodeBook } from '#shared/code-book';
import type { Dependencies } from '../../dependencies';

/**
 * Gives the columns of a loading cut the ids that a code book has for their names; a column that
 * the code book does not describe gets one that no other has.
 */
export async function assignColumnIds(
  { database }: Dependencies,
  studyId: string,
  cutId: string,
  codeBook: CodeBook,
): Promise<void> {
  const { cutColumns } = database.stores;
  const known = new Map(codeBook.columns.map(({ name, id }) => [name, id]));
  await database.unitOfWork(`study:${studyId}`, async (unit) => {
    const columns = await cutColumns.list(cutId, unit);
    const names = columns.map(({ name }) => name);
    const ids = columnIdsFor(names, known, [COUNTED_OUTCOME_COLUMN_ID]);
    if (columns.every(({ columnId }, at) => columnId === ids[at])) return;
    const renamed = columns.map((column, at) => ({ ...column, columnId: ids[at] ?? '' }));
    await cutColumns.replaceAll(cutId, renamed, unit);
  });
}
