import { stat } from 'node:fs/promises';
import type { Dependencies } from '../../dependencies';
import { intakeProblem } from '../../intake/intake-issue';
import type { Upload } from '../../models/upload/upload-store';
import { timestamp } from '../../runtime/clock';
import { beginReading } from './begin-reading';
import { discardUpload } from './discard-upload';
import { loadingCut } from './loading-cut';
import { NOTHING_READ } from './receive-upload';
import { removeLoadingCut } from './remove-loading-cut';
import { sweepFiles } from './sweep-files';
import { absolutePath } from './upload-files';

/** Days after which an upload that nobody stored is given up. */
const DAYS_KEPT = 14;

const DAY_IN_MILLISECONDS = 86_400_000;

/**
 * Puts right what a stop left of uploads: unfinished cuts and files without an upload go, files
 * that were being read are read again from the start, and uploads that nobody stored for two weeks
 * are given up.
 */
export async function resumeUploads(dependencies: Dependencies): Promise<void> {
  await sweepFiles(dependencies);
  const { uploads } = dependencies.database.stores;
  const waiting = await uploads.listInState(['profiled', 'failed']);
  for (const upload of waiting.filter((one) => isForgotten(dependencies, one))) {
    await discardUpload(dependencies, upload.studyId, upload.id);
  }
  const profiled = new Set((await uploads.listInState(['profiled'])).map(({ cutId }) => cutId));
  for (const cutId of await dependencies.database.stores.cuts.listLoading()) {
    if (!profiled.has(cutId)) await removeLoadingCut(dependencies, cutId);
  }
  for (const upload of await uploads.listInState(['reading'])) await resume(dependencies, upload);
}

function isForgotten({ clock }: Dependencies, { updatedAt }: Upload): boolean {
  return clock.now().getTime() - Date.parse(updatedAt) > DAYS_KEPT * DAY_IN_MILLISECONDS;
}

async function resume(dependencies: Dependencies, upload: Upload): Promise<void> {
  const { database, config, clock } = dependencies;
  const there = await isThere(absolutePath(config, upload.filePath));
  const cut = loadingCut(dependencies, upload.personId, upload.fileName);
  const updatedAt = timestamp(clock);
  const change = there
    ? { ...NOTHING_READ, cutId: cut.id, updatedAt }
    : { ...INTERRUPTED, cutId: null, updatedAt };
  await database.unitOfWork(`study:${upload.studyId}`, async (unit) => {
    if (there) await database.stores.cuts.insert(cut, unit);
    await database.stores.uploads.update(upload.id, 'reading', change, unit);
  });
  if (there) beginReading(dependencies, { ...upload, ...change });
}

const INTERRUPTED = { state: 'failed', problem: intakeProblem({ code: 'interrupted' }) } as const;

function isThere(path: string): Promise<boolean> {
  return stat(path).then(
    () => true,
    () => false,
  );
}
