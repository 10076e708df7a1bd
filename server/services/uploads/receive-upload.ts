import type { ReadingOptions } from '#shared/api';
import type { Dependencies } from '../../dependencies';
import { refuseField, type Outcome } from '../../errors/server-issue';
import type { Study } from '../../models/study/study-store';
import type { Upload } from '../../models/upload/upload-store';
import type { User } from '../../models/user/user-store';
import { timestamp } from '../../runtime/clock';
import { beginReading } from './begin-reading';
import { loadingCut } from './loading-cut';
import { keepFile, uploadPath } from './upload-files';

/** A file that arrived, how to read it, and the data set that it is for, if that is known. */
export interface ArrivedFile {
  readonly path: string;
  readonly fileName: string;
  readonly options: ReadingOptions;
  readonly dataSetId: string | null;
}

const LONGEST_FILE_NAME = 255;

/** Keeps a file that arrived and begins to read it; reading goes on after the answer. */
export async function receiveUpload(
  dependencies: Dependencies,
  person: User,
  study: Study,
  { path, fileName, options, dataSetId }: ArrivedFile,
): Promise<Outcome<Upload>> {
  const { database, config, ids, clock } = dependencies;
  if (dataSetId !== null && (await database.stores.dataSets.find(study.id, dataSetId)) === null) {
    return refuseField('dataSetId', 'There is no such data set in this study.');
  }
  const [id, now] = [ids.next(), timestamp(clock)];
  const shownName = fileName.slice(-LONGEST_FILE_NAME);
  const cut = loadingCut(dependencies, person.id, shownName);
  const upload: Upload = {
    id,
    studyId: study.id,
    dataSetId,
    personId: person.id,
    fileName: shownName,
    filePath: uploadPath(id),
    options,
    cutId: cut.id,
    ...NOTHING_READ,
    createdAt: now,
    updatedAt: now,
  };
  await keepFile(config, path, upload.filePath);
  await database.unitOfWork(`study:${study.id}`, async (unit) => {
    await database.stores.cuts.insert(cut, unit);
    await database.stores.uploads.insert(upload, unit);
  });
  beginReading(dependencies, upload);
  return { ok: true, value: upload };
}

/** What is known of a file before it is read. */
export const NOTHING_READ = {
  state: 'reading',
  progress: 0,
  rowsRead: 0,
  sha256: null,
  profile: null,
  proposal: null,
  problem: null,
} as const;
