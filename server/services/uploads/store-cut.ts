import type { StoreCutRequest } from '#shared/api';
import { adoptIds, validateCodeBook, type CodeBook } from '#shared/code-book';
import { tallyIssueMessage } from '#shared/tally';
import type { Dependencies } from '../../dependencies';
import { refuse, refuseField, type Outcome } from '../../errors/server-issue';
import type { CodeBookVersion } from '../../models/code-book/code-book-store';
import type { Study } from '../../models/study/study-store';
import type { Upload } from '../../models/upload/upload-store';
import type { User } from '../../models/user/user-store';
import { repinReports } from '../analyses/recompute-analyses';
import { codeBookProblems } from '../code-books/code-book-problems';
import { refuseStaleCodeBook } from '../code-books/refuse-stale';
import { assignColumnIds } from './assign-column-ids';
import { finishCut, type FinishedCut } from './finish-cut';
import { dropFile } from './upload-files';

/**
 * Makes a read file a cut of a data set, described by a code book; gives the cut's id.
 *
 * Refused while the file is not read, when somebody changed the code book since it was, and when
 * the rows can't be counted as the code book says. The cut is stored whole or not at all.
 */
export async function storeCut(
  dependencies: Dependencies,
  person: User,
  study: Study,
  uploadId: string,
  request: StoreCutRequest,
): Promise<Outcome<string>> {
  const prepared = await prepare(dependencies, study, uploadId, request);
  if (!prepared.ok) return prepared;
  const { upload, newest, codeBook } = prepared.value;
  const cut: FinishedCut = { upload, newest, codeBook, request, personId: person.id };
  const stored = await finishCut(dependencies, cut);
  if (!stored.ok) return stored;
  await dropFile(dependencies.config, upload.filePath);
  if (newest !== null && stored.value.codeBookId !== newest.id) {
    await repinReports(dependencies, person.id, study, newest.dataSetId);
  }
  return { ok: true, value: stored.value.cutId };
}

interface PreparedCut {
  readonly upload: Upload & { readonly cutId: string };
  /** The newest code book of the data set; null for a new data set. */
  readonly newest: CodeBookVersion | null;
  readonly codeBook: CodeBook;
}

async function prepare(
  dependencies: Dependencies,
  study: Study,
  uploadId: string,
  request: StoreCutRequest,
): Promise<Outcome<PreparedCut>> {
  const upload = await dependencies.database.stores.uploads.find(study.id, uploadId);
  if (upload === null) return refuse('notFound');
  const { cutId } = upload;
  if (upload.state !== 'profiled' || cutId === null) return refuse('uploadNotReady');
  const newest = await newestCodeBook(dependencies, study, request.dataSetId);
  if (!newest.ok) return newest;
  const stale = refuseStale(upload, request, newest.value);
  if (stale !== null) return stale;
  const codeBook =
    newest.value === null ? request.codeBook : adoptIds(request.codeBook, newest.value.content);
  const fit = await checkFit(dependencies, upload, cutId, codeBook);
  if (!fit.ok) return fit;
  return { ok: true, value: { upload: { ...upload, cutId }, newest: newest.value, codeBook } };
}

async function newestCodeBook(
  { database }: Dependencies,
  study: Study,
  dataSetId: string | null,
): Promise<Outcome<CodeBookVersion | null>> {
  if (dataSetId === null) return { ok: true, value: null };
  if ((await database.stores.dataSets.find(study.id, dataSetId)) === null) {
    return refuseField('dataSetId', 'There is no such data set in this study.');
  }
  return { ok: true, value: await database.stores.codeBooks.newest(dataSetId) };
}

/** What was carried over from an older version would take back what came since. */
function refuseStale(
  { dataSetId, proposal }: Upload,
  request: StoreCutRequest,
  newest: CodeBookVersion | null,
): ReturnType<typeof refuse> | null {
  const carried = dataSetId !== null && dataSetId === request.dataSetId;
  if (!carried || newest === null || newest.number === proposal?.codeBookNumber) return null;
  return refuseStaleCodeBook(newest, request.codeBook);
}

async function checkFit(
  dependencies: Dependencies,
  upload: Upload,
  cutId: string,
  codeBook: CodeBook,
): Promise<Outcome<undefined>> {
  const problems = codeBookProblems(validateCodeBook(codeBook), 'codeBook');
  if (problems.length > 0) return refuse('invalidRequest', { fields: problems });
  await assignColumnIds(dependencies, upload.studyId, cutId, codeBook);
  const issue = await dependencies.counting.checkCounts(cutId, codeBook);
  return issue === null
    ? { ok: true, value: undefined }
    : refuseField('codeBook.layout', tallyIssueMessage(issue));
}
