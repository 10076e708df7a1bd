import type {
  InferAttributes,
  InferCreationAttributes,
  Model,
  ModelStatic,
  Sequelize,
} from 'sequelize';
import { key, text, whole } from '../columns';

/** A stored result; immutable. `content` is a JSON `AnalysisResult` with the counts it used. */
export interface ResultModel extends Model<
  InferAttributes<ResultModel>,
  InferCreationAttributes<ResultModel>
> {
  id: string;
  analysisId: string;
  analysisVersion: number;
  cutId: string;
  codeBookId: string;
  engineVersion: string;
  content: string;
  createdAt: string;
}

/** Binds the table of results to a database. */
export function defineResults(sequelize: Sequelize): ModelStatic<ResultModel> {
  return sequelize.define<ResultModel>('results', {
    id: key(),
    analysisId: text(),
    analysisVersion: whole(),
    cutId: text(),
    codeBookId: text(),
    engineVersion: text(),
    content: text(),
    createdAt: text(),
  });
}
