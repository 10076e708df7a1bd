import type { AnalysisResult } from '#shared/analysis';
import type { CodeBook } from '#shared/code-book';
import type { Dependencies } from '../../server/dependencies';
import type { Study } from '../../server/models/study/study-store';
import type { User } from '../../server/models/user/user-store';

const NO_COLUMNS: CodeBook = { schemaVersion: 1, layout: { kind: 'records' }, columns: [] };

/** An analysis that was stored without counting anything, and its newest result. */
export interface StoredAnalysis {
  readonly id: string;
  readonly resultId: string;
  /** Stores a newer result of the same analysis, under a newer code book; gives its id. */
  readonly addResult: (content: AnalysisResult) => Promise<string>;
}

/** Stores an analysis of a study with this result, over a cut without columns. */
export async function storeAnalysis(
  dependencies: Dependencies,
  study: Study,
  person: User,
  content: AnalysisResult,
): Promise<StoredAnalysis> {
  const { ids } = dependencies;
  const [id, dataSetId, cutId] = [ids.next(), ids.next(), ids.next()];
  await storeCut(dependencies, study, person, dataSetId, cutId);
  await storeFirstVersion(dependencies, study, person, { id, cutId }, content);
  let number = 0;
  const addResult = async (result: AnalysisResult): Promise<string> => {
    number += 1;
    return storeResult(dependencies, person, { id, cutId, dataSetId, number }, result);
  };
  return { id, resultId: await addResult(content), addResult };
}

function now({ clock }: Dependencies): string {
  return clock.now().toISOString();
}

async function storeCut(
  dependencies: Dependencies,
  study: Study,
  person: User,
  dataSetId: string,
  cutId: string,
): Promise<void> {
  const { database } = dependencies;
  const createdAt = now(dependencies);
  await database.unitOfWork('site', (unit) =>
    database.stores.dataSets.insert(
      { id: dataSetId, studyId: study.id, name: 'Staff', createdAt },
      unit,
    ),
  );
  const row = { id: cutId, data_set_id: dataSetId, number: 1, data_date: '2026-01-31', rows: 0 };
  const rest = { file_name: 'a.csv', sha256: '', state: 'ready', profile: '{}' };
  const by = { created_at: createdAt, created_by: person.id };
  const queries = database.sequelize.getQueryInterface();
  await queries.bulkInsert('cuts', [{ ...row, ...rest, ...by }]);
}

async function storeFirstVersion(
  dependencies: Dependencies,
  study: Study,
  person: User,
  { id, cutId }: { readonly id: string; readonly cutId: string },
  content: AnalysisResult,
): Promise<void> {
  const { database } = dependencies;
  const { analyses } = database.stores;
  const at = now(dependencies);
  await database.unitOfWork('site', async (unit) => {
    const number = await analyses.nextNumber(study.id, unit);
    const times = { createdAt: at, updatedAt: at, removedAt: null };
    const name = 'Wet work';
    await analyses.insert({ id, studyId: study.id, number, name, version: 1, ...times }, unit);
    const version = { analysisId: id, number: 1, name, cutId, at, personId: person.id };
    const { specification } = content;
    await analyses.insertVersion({ ...version, specification, reason: null }, unit);
  });
}

interface ResultPlace {
  readonly id: string;
  readonly cutId: string;
  readonly dataSetId: string;
  readonly number: number;
}

async function storeResult(
  dependencies: Dependencies,
  person: User,
  { id, cutId, dataSetId, number }: ResultPlace,
  content: AnalysisResult,
): Promise<string> {
  const { database, ids } = dependencies;
  const createdAt = now(dependencies);
  const [codeBookId, resultId] = [ids.next(), ids.next()];
  const by = { createdAt, createdBy: person.id };
  await database.unitOfWork('site', async (unit) => {
    const book = { id: codeBookId, dataSetId, number, content: NO_COLUMNS, ...by };
    await database.stores.codeBooks.insert(book, unit);
    const key = { analysisId: id, analysisVersion: 1, cutId, codeBookId, engineVersion: '1' };
    await database.stores.results.insert({ id: resultId, ...key, content, createdAt }, unit);
  });
  return resultId;
}
