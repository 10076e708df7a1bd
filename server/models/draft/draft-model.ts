import type {
  InferAttributes,
  InferCreationAttributes,
  Model,
  ModelStatic,
  Sequelize,
} from 'sequelize';
import { key, text, whole } from '../columns';

/** What a person has typed in a block and not yet made a step of; `content` is JSON. */
export interface DraftModel extends Model<
  InferAttributes<DraftModel>,
  InferCreationAttributes<DraftModel>
> {
  reportId: string;
  blockId: string;
  personId: string;
  baseVersion: number;
  content: string;
  savedAt: string;
}

/** Binds the table of drafts to a database. */
export function defineDrafts(sequelize: Sequelize): ModelStatic<DraftModel> {
  return sequelize.define<DraftModel>('drafts', {
    reportId: key(),
    blockId: key(),
    personId: key(),
    baseVersion: whole(),
    content: text(),
    savedAt: text(),
  });
}
