import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type ModelStatic,
  type Sequelize,
} from 'sequelize';
import { key, optionalText, text } from '../columns';

/** A browser's session, written by the session store. `userId` lets sessions of a person end. */
export interface SessionModel extends Model<
  InferAttributes<SessionModel>,
  InferCreationAttributes<SessionModel>
> {
  sid: string;
  expires: Date;
  data: string;
  userId: string | null;
}

/** Binds the table of sessions to a database. */
export function defineSessions(sequelize: Sequelize): ModelStatic<SessionModel> {
  return sequelize.define<SessionModel>('sessions', {
    sid: key(),
    expires: { type: DataTypes.DATE, allowNull: false },
    data: text(),
    userId: optionalText(),
  });
}
