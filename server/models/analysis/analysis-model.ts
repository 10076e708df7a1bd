import type {
  InferAttributes,
  InferCreationAttributes,
  Model,
  ModelStatic,
  Sequelize,
} from 'sequelize';
import { key, optionalText, text, whole } from '../columns';

/** An analysis of a study. `number` counts within the study (A2); `version` is the present one. */
export interface AnalysisModel extends Model<
  InferAttributes<AnalysisModel>,
  InferCreationAttributes<AnalysisModel>
> {
  id: string;
  studyId: string;
  number: number;
  name: string;
  version: number;
  createdAt: string;
  updatedAt: string;
  removedAt: string | null;
}

/** Binds the table of analyses to a database. */
export function defineAnalyses(sequelize: Sequelize): ModelStatic<AnalysisModel> {
  return sequelize.define<AnalysisModel>('analyses', {
    id: key(),
    studyId: text(),
    number: whole(),
    name: text(),
    version: whole(),
    createdAt: text(),
    updatedAt: text(),
    removedAt: optionalText(),
  });
}
