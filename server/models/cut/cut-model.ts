import type { InferAttributes, InferCreationAttributes, Model, ModelStatic, Sequelize } from 'sequelize';
import { key, text, whole } from '../columns';

/** A cut is visible once it is ready; destroyed ones keep their counts, not their columns. */
export type CutState = 'loading' | 'ready' | 'destroyed';

/** A dated version of a data set; immutable once ready. `profile` is a JSON `CutProfile`. */
export interface CutModel extends Model<InferAttributes<CutModel>, InferCreationAttributes<CutModel>> {
  id: string;
  dataSetId: string;
  number: number;
  dataDate: string;
  fileName: string;
  rows: number;
  sha256: string;
  state: CutState;
  profile: string;
  createdAt: string;
  createdBy: string;
}

/** Binds the table of cuts to a database. */
export function defineCuts(sequelize: Sequelize): ModelStatic<CutModel> {
  return sequelize.define<CutModel>('cuts', {
    id: key(),
    dataSetId: text(),
    number: whole(),
    dataDate: text(),
    fileName: text(),
    rows: whole(),
    sha256: text(),
    state: text(),
    profile: text(),
    createdAt: text(),
    createdBy: text(),
  });
}
