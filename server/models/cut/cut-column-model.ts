import type { InferAttributes, InferCreationAttributes, Model, ModelStatic, Sequelize } from 'sequelize';
import { key, text, whole } from '../columns';

/**
 * One column of a cut. `width` is the number of bytes of a code; the codes and the dictionary lie
 * in chunks.
 */
export interface CutColumnModel
  extends Model<InferAttributes<CutColumnModel>, InferCreationAttributes<CutColumnModel>> {
  cutId: string;
  columnId: string;
  position: number;
  name: string;
  width: number;
  dictionarySize: number;
}

/** Binds the table of a cut's columns to a database. */
export function defineCutColumns(sequelize: Sequelize): ModelStatic<CutColumnModel> {
  return sequelize.define<CutColumnModel>('cut_columns', {
    cutId: key(),
    columnId: key(),
    position: whole(),
    name: text(),
    width: whole(),
    dictionarySize: whole(),
  });
}
