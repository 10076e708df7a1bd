import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import { removeLoadingCut } from './remove-loading-cut';
import { dropFile } from './upload-files';

/** Gives an upload up: its file and what was read of it go. A cut that was stored stays. */
export async function discardUpload(
  dependencies: Dependencies,
  studyId: string,
  uploadId: string,
): Promise<Outcome<undefined>> {
  const { database, intake, config } = dependencies;
  const upload = await database.stores.uploads.find(studyId, uploadId);
  if (upload === null) return refuse('notFound');
  await intake.stop(uploadId);
  await database.unitOfWork(`study:${studyId}`, (unit) =>
    database.stores.uploads.remove(uploadId, unit),
  );
  if (upload.cutId !== null) await removeLoadingCut(dependencies, upload.cutId);
  await dropFile(config, upload.filePath);
  return { ok: true, value: undefined };
}
