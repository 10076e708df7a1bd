import type {
  InferAttributes,
  InferCreationAttributes,
  Model,
  ModelStatic,
  Sequelize,
} from 'sequelize';
import { key, text } from '../columns';

/** Stored counts. `hash` is made of the cut, the column-to-level maps and the restriction. */
export interface TallyModel extends Model<
  InferAttributes<TallyModel>,
  InferCreationAttributes<TallyModel>
> {
  hash: string;
  cutId: string;
  content: string;
  createdAt: string;
}

/** Binds the table of tallies to a database. */
export function defineTallies(sequelize: Sequelize): ModelStatic<TallyModel> {
  return sequelize.define<TallyModel>('tallies', {
    hash: key(),
    cutId: text(),
    content: text(),
    createdAt: text(),
  });
}
