import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type ModelStatic,
  type Sequelize,
} from 'sequelize';
import { key, optionalText, text } from '../columns';

/** One version of an analysis; immutable. `specification` is a JSON `AnalysisSpecification`. */
export interface AnalysisVersionModel extends Model<
  InferAttributes<AnalysisVersionModel>,
  InferCreationAttributes<AnalysisVersionModel>
> {
  analysisId: string;
  number: number;
  name: string;
  cutId: string;
  specification: string;
  reason: string | null;
  personId: string;
  at: string;
}

/** Binds the table of analysis versions to a database. */
export function defineAnalysisVersions(sequelize: Sequelize): ModelStatic<AnalysisVersionModel> {
  return sequelize.define<AnalysisVersionModel>('analysis_versions', {
    analysisId: key(),
    number: key(DataTypes.INTEGER),
    name: text(),
    cutId: text(),
    specification: text(),
    reason: optionalText(),
    personId: text(),
    at: text(),
  });
}
