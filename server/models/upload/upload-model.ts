import type {
  InferAttributes,
  InferCreationAttributes,
  Model,
  ModelStatic,
  Sequelize,
} from 'sequelize';
import { key, optionalText, real, text, whole } from '../columns';

/** How far an upload is. */
export type UploadState = 'reading' | 'profiled' | 'storing' | 'stored' | 'failed';

/**
 * A file on its way to become a cut. `filePath` is where the bytes are staged, relative to the data
 * directory. JSON: `options` ReadingOptions, `profile` CutProfile, `proposal` a code book to start
 * from, `problem` { code, message, wayOut }.
 */
export interface UploadModel extends Model<
  InferAttributes<UploadModel>,
  InferCreationAttributes<UploadModel>
> {
  id: string;
  studyId: string;
  dataSetId: string | null;
  personId: string;
  fileName: string;
  filePath: string;
  sha256: string | null;
  state: UploadState;
  progress: number;
  rowsRead: number;
  options: string;
  profile: string | null;
  proposal: string | null;
  problem: string | null;
  cutId: string | null;
  createdAt: string;
  updatedAt: string;
}

/** Binds the table of uploads to a database. */
export function defineUploads(sequelize: Sequelize): ModelStatic<UploadModel> {
  return sequelize.define<UploadModel>('uploads', {
    id: key(),
    studyId: text(),
    dataSetId: optionalText(),
    personId: text(),
    fileName: text(),
    filePath: text(),
    sha256: optionalText(),
    state: text(),
    progress: real(),
    rowsRead: whole(),
    options: text(),
    profile: optionalText(),
    proposal: optionalText(),
    problem: optionalText(),
    cutId: optionalText(),
    createdAt: text(),
    updatedAt: text(),
  });
}
