import type { ReadingOptions } from '#shared/api';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { Upload } from '../../models/upload/upload-store';
import { timestamp } from '../../runtime/clock';
import { beginReading } from './begin-reading';
import { loadingCut } from './loading-cut';
import { NOTHING_READ } from './receive-upload';
import { removeLoadingCut } from './remove-loading-cut';

/** Reads the file of an upload again in another way; what was read of it before is thrown away. */
export async function changeReadingOptions(
  dependencies: Dependencies,
  studyId: string,
  uploadId: string,
  options: ReadingOptions,
): Promise<Outcome<Upload>> {
  const { database, intake, clock } = dependencies;
  await intake.stop(uploadId);
  const upload = await database.stores.uploads.find(studyId, uploadId);
  if (upload === null) return refuse('notFound');
  const cut = loadingCut(dependencies, upload.personId, upload.fileName);
  const change = { options, cutId: cut.id, ...NOTHING_READ, updatedAt: timestamp(clock) };
  const again = await database.unitOfWork<Outcome<Upload>>(`study:${studyId}`, async (unit) => {
    if (upload.state === 'stored' || upload.state === 'storing') return refuse('uploadStored');
    await database.stores.cuts.insert(cut, unit);
    const changed = await database.stores.uploads.update(uploadId, upload.state, change, unit);
    return changed ? { ok: true, value: { ...upload, ...change } } : refuse('uploadStored');
  });
  if (!again.ok) return again;
  if (upload.cutId !== null) await removeLoadingCut(dependencies, upload.cutId);
  beginReading(dependencies, again.value);
  return again;
}
