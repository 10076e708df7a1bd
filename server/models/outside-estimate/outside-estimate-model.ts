import type {
  InferAttributes,
  InferCreationAttributes,
  Model,
  ModelStatic,
  Sequelize,
} from 'sequelize';
import { key, optionalText, text, whole } from '../columns';

/** An estimate from elsewhere beside an analysis; `entry` is a JSON `OutsideEstimateEntry`. */
export interface OutsideEstimateModel extends Model<
  InferAttributes<OutsideEstimateModel>,
  InferCreationAttributes<OutsideEstimateModel>
> {
  id: string;
  studyId: string;
  analysisId: string;
  version: number;
  entry: string;
  personId: string;
  createdAt: string;
  updatedAt: string;
  removedAt: string | null;
}

/** Binds the table of estimates from elsewhere to a database. */
export function defineOutsideEstimates(sequelize: Sequelize): ModelStatic<OutsideEstimateModel> {
  return sequelize.define<OutsideEstimateModel>('outside_estimates', {
    id: key(),
    studyId: text(),
    analysisId: text(),
    version: whole(),
    entry: text(),
    personId: text(),
    createdAt: text(),
    updatedAt: text(),
    removedAt: optionalText(),
  });
}
