import { copyFile, mkdtemp } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { CodeBook } from '#shared/code-book';
import type { Dependencies } from '../server/dependencies';
import type { Study } from '../server/models/study/study-store';
import type { User } from '../server/models/user/user-store';
import { receiveUpload } from '../server/services/uploads/receive-upload';
import { storeCut } from '../server/services/uploads/store-cut';
import { viewUpload } from '../server/services/uploads/view-upload';
import type { DemonstrationStudy } from './demonstration-study';
import { done } from './done';

const AS_THE_FILE_IS = { delimiter: null, encoding: null, decimalMark: null, sheet: null } as const;

/** Loads the cuts of a demonstration study one after the other; gives the id of the last. */
export async function loadCuts(
  dependencies: Dependencies,
  analyst: User,
  study: Study,
  { dataSetName, cuts, describe }: DemonstrationStudy,
): Promise<string> {
  let [dataSetId, cutId]: [string | null, string] = [null, ''];
  for (const { file, dataDate } of cuts) {
    const [uploadId, proposed] = await readFile(dependencies, analyst, study, file, dataSetId);
    const codeBook = dataSetId === null ? describe(proposed) : proposed;
    const request = { dataSetId, dataSetName, dataDate, codeBook };
    cutId = done(await storeCut(dependencies, analyst, study, uploadId, request));
    dataSetId = await dataSetOf(dependencies, study, cutId);
  }
  return cutId;
}

async function readFile(
  dependencies: Dependencies,
  analyst: User,
  study: Study,
  fileName: string,
  dataSetId: string | null,
): Promise<readonly [uploadId: string, proposed: CodeBook]> {
  const path = await copyOf(dependencies, fileName);
  const arrived = { path, fileName, options: AS_THE_FILE_IS, dataSetId };
  const { id } = done(await receiveUpload(dependencies, analyst, study, arrived));
  await dependencies.background.idle();
  const { proposal, problem } = done(await viewUpload(dependencies, study.id, id));
  if (proposal === null) throw new Error(`${fileName}: ${problem?.message ?? 'not read'}`);
  return [id, proposal.codeBook];
}

/** Uploads are moved to where they are kept, so a copy of the file goes in. */
async function copyOf({ config }: Dependencies, fileName: string): Promise<string> {
  const copy = join(await mkdtemp(join(tmpdir(), 'evenhand-seed-')), fileName);
  await copyFile(join(config.templatesDirectory, '..', 'seeds', 'data', fileName), copy);
  return copy;
}

async function dataSetOf({ database }: Dependencies, study: Study, cutId: string): Promise<string> {
  const cut = await database.stores.cutFacts.findReady(study.id, cutId);
  if (cut === null) throw new Error(`The cut ${cutId} was not stored.`);
  return cut.dataSetId;
}
