import type {
  InferAttributes,
  InferCreationAttributes,
  Model,
  ModelStatic,
  Sequelize,
} from 'sequelize';
import { key, text } from '../columns';

/** A data set of a study; its cuts are the dated versions. */
export interface DataSetModel extends Model<
  InferAttributes<DataSetModel>,
  InferCreationAttributes<DataSetModel>
> {
  id: string;
  studyId: string;
  name: string;
  createdAt: string;
}

/** Binds the table of data sets to a database. */
export function defineDataSets(sequelize: Sequelize): ModelStatic<DataSetModel> {
  return sequelize.define<DataSetModel>('data_sets', {
    id: key(),
    studyId: text(),
    name: text(),
    createdAt: text(),
  });
}
