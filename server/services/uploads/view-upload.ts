import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { Upload } from '../../models/upload/upload-store';

/** An upload of a study, with how far its reading is at this moment. */
export async function viewUpload(
  { database, intake }: Dependencies,
  studyId: string,
  uploadId: string,
): Promise<Outcome<Upload>> {
  const upload = await database.stores.uploads.find(studyId, uploadId);
  if (upload === null) return refuse('notFound');
  const progress = upload.state === 'reading' ? intake.progressOf(uploadId) : null;
  if (progress === null) return { ok: true, value: upload };
  return { ok: true, value: { ...upload, progress: progress.share, rowsRead: progress.rows } };
}
