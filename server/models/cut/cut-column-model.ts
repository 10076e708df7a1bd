import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type ModelStatic,
  type Sequelize,
} from 'sequelize';
import { key, text, whole } from '../columns';

/**
 * One column of a cut, by its place in the file. `columnId` is what the code book calls it. `width`
 * is the number of bytes of the widest code; codes lie in chunks of `chunkRows` rows.
 */
export interface CutColumnModel extends Model<
  InferAttributes<CutColumnModel>,
  InferCreationAttributes<CutColumnModel>
> {
  cutId: string;
  position: number;
  columnId: string;
  name: string;
  width: number;
  chunkRows: number;
  dictionarySize: number;
}

/** Binds the table of a cut's columns to a database. */
export function defineCutColumns(sequelize: Sequelize): ModelStatic<CutColumnModel> {
  return sequelize.define<CutColumnModel>('cut_columns', {
    cutId: key(),
    position: key(DataTypes.INTEGER),
    columnId: text(),
    name: text(),
    width: whole(),
    chunkRows: whole(),
    dictionarySize: whole(),
  });
}
