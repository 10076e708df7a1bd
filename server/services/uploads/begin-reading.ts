import type { Dependencies } from '../../dependencies';
import { intakeProblem, type IntakeIssue } from '../../intake/intake-issue';
import type { ReadFile } from '../../intake/read-file';
import type { CodeBookVersion } from '../../models/code-book/code-book-store';
import type { Upload, UploadChange } from '../../models/upload/upload-store';
import { timestamp } from '../../runtime/clock';
import { removeLoadingCut } from './remove-loading-cut';
import { absolutePath } from './upload-files';

/** Begins to read the file of an upload into its loading cut; nobody waits for it. */
export function beginReading(dependencies: Dependencies, upload: Upload): void {
  dependencies.background.run('Reading an upload', () => readUpload(dependencies, upload));
}

async function readUpload(dependencies: Dependencies, upload: Upload): Promise<void> {
  const { database, intake, config } = dependencies;
  const { cutId, dataSetId } = upload;
  if (cutId === null) throw new Error(`Upload ${upload.id} has no cut to load.`);
  const codeBook = dataSetId === null ? null : await database.stores.codeBooks.newest(dataSetId);
  const order = {
    path: absolutePath(config, upload.filePath),
    fileName: upload.fileName,
    options: upload.options,
    previous: codeBook?.content ?? null,
  };
  const end = await intake.read({
    id: upload.id,
    order,
    storeChunks: (chunks) =>
      database.unitOfWork(`study:${upload.studyId}`, (unit) =>
        database.stores.columnChunks.insertAll(
          chunks.map((chunk) => ({ ...chunk, cutId, bytes: Buffer.from(chunk.bytes.buffer) })),
          unit,
        ),
      ),
  });
  if (end === null) return;
  if (end.ok) await settleRead(dependencies, upload, cutId, codeBook, end.value);
  else await settleFailed(dependencies, upload, cutId, end.issue);
}

async function settleRead(
  { database, clock }: Dependencies,
  upload: Upload,
  cutId: string,
  codeBook: CodeBookVersion | null,
  { sha256, rows, columns, profile, proposal }: ReadFile,
): Promise<void> {
  const change: UploadChange = {
    state: 'profiled',
    progress: 1,
    rowsRead: rows,
    sha256,
    profile,
    proposal: { ...proposal, codeBookNumber: codeBook?.number ?? null },
    updatedAt: timestamp(clock),
  };
  await database.unitOfWork(`study:${upload.studyId}`, async (unit) => {
    const { cuts, cutColumns, uploads } = database.stores;
    const present = await uploads.find(upload.studyId, upload.id, unit);
    if (present?.cutId !== cutId) return;
    const stored = columns.map((column) => ({ ...column, cutId }));
    await cutColumns.insertAll(stored, unit);
    await cuts.noteContents(cutId, { rows, sha256, profile }, unit);
    await uploads.update(upload.id, 'reading', change, unit);
  });
}

async function settleFailed(
  dependencies: Dependencies,
  upload: Upload,
  cutId: string,
  issue: IntakeIssue,
): Promise<void> {
  const { database, clock } = dependencies;
  await removeLoadingCut(dependencies, cutId);
  const change: UploadChange = {
    state: 'failed',
    problem: intakeProblem(issue),
    cutId: null,
    updatedAt: timestamp(clock),
  };
  await database.unitOfWork(`study:${upload.studyId}`, (unit) =>
    database.stores.uploads.update(upload.id, 'reading', change, unit),
  );
}
