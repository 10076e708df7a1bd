import type { TypedCountsRequest } from '#shared/api';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import { encodeColumn, ROWS_OF_A_TYPED_CHUNK } from '../../intake/encode/encode-column';
import type { Study } from '../../models/study/study-store';
import type { Unit } from '../../models/unit-of-work';
import type { User } from '../../models/user/user-store';
import { loadingCut } from '../uploads/loading-cut';
import { placeCut } from './place-cut';
import { typedCountsProblems } from './typed-counts-problems';
import { typedTable, type TypedTable } from './typed-table';

/** Stores counts that were typed into a grid as a new data set; gives the cut's id. */
export async function storeTypedCounts(
  dependencies: Dependencies,
  person: User,
  study: Study,
  request: TypedCountsRequest,
): Promise<Outcome<string>> {
  const problems = typedCountsProblems(request);
  if (problems.length > 0) return refuse('invalidRequest', { fields: problems });
  const table = typedTable(request);
  return dependencies.database.unitOfWork(`study:${study.id}`, async (unit) => {
    const cutId = await insertTable(dependencies, person.id, table, unit);
    const { dataSetName, dataDate } = request;
    const { profile, codeBook } = table;
    const place = { cutId, studyId: study.id, personId: person.id, dataSetId: null, newest: null };
    const placed = await placeCut(
      dependencies,
      { ...place, dataSetName, dataDate, profile, codeBook },
      unit,
    );
    return placed.ok ? { ok: true, value: cutId } : placed;
  });
}

/** At most a thousand rows, so that all of it is one small transaction. */
async function insertTable(
  dependencies: Dependencies,
  personId: string,
  { cells, profile, sha256 }: TypedTable,
  unit: Unit,
): Promise<string> {
  const { cuts, cutColumns, columnChunks } = dependencies.database.stores;
  const cut = loadingCut(dependencies, personId, profile.fileName);
  await cuts.insert({ ...cut, rows: profile.rows, sha256 }, unit);
  for (const [position, column] of profile.columns.entries()) {
    const { chunks, width, dictionarySize } = encodeColumn(position, cells[position] ?? []);
    const { columnId, name } = column;
    const facts = { cutId: cut.id, position, columnId, name, width, dictionarySize };
    await cutColumns.insertAll([{ ...facts, chunkRows: ROWS_OF_A_TYPED_CHUNK }], unit);
    const stored = chunks.map((chunk) => ({ ...chunk, bytes: Buffer.from(chunk.bytes) }));
    await columnChunks.insertAll(
      stored.map((chunk) => ({ ...chunk, cutId: cut.id })),
      unit,
    );
  }
  return cut.id;
}
