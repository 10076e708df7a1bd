import type {
  InferAttributes,
  InferCreationAttributes,
  Model,
  ModelStatic,
  Sequelize,
} from 'sequelize';
import { key, optionalText, text, whole } from '../columns';

/** A block of a report. `content` is JSON of its kind; a removed block stays as a tombstone. */
export interface BlockModel extends Model<
  InferAttributes<BlockModel>,
  InferCreationAttributes<BlockModel>
> {
  reportId: string;
  id: string;
  kind: string;
  orderKey: string;
  content: string;
  version: number;
  positionVersion: number;
  removedAt: string | null;
}

/** Binds the table of blocks to a database. */
export function defineBlocks(sequelize: Sequelize): ModelStatic<BlockModel> {
  return sequelize.define<BlockModel>('blocks', {
    reportId: key(),
    id: key(),
    kind: text(),
    orderKey: text(),
    content: text(),
    version: whole(),
    positionVersion: whole(),
    removedAt: optionalText(),
  });
}
