import type {
  InferAttributes,
  InferCreationAttributes,
  Model,
  ModelStatic,
  Sequelize,
} from 'sequelize';
import { key, optionalText, optionalWhole, text, whole } from '../columns';

/** A cut is visible once it is ready; destroyed ones keep their counts, not their columns. */
export type CutState = 'loading' | 'ready' | 'destroyed';

/**
 * A dated version of a data set; immutable once ready. While it loads nobody need know yet whose
 * it is, so `dataSetId` and `number` are null. `profile` is a JSON `CutProfile`.
 */
export interface CutModel extends Model<
  InferAttributes<CutModel>,
  InferCreationAttributes<CutModel>
> {
  id: string;
  dataSetId: string | null;
  number: number | null;
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
    dataSetId: optionalText(),
    number: optionalWhole(),
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
