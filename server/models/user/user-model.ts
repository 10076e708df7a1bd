import type {
  InferAttributes,
  InferCreationAttributes,
  Model,
  ModelStatic,
  Sequelize,
} from 'sequelize';
import { flag, key, optionalText, text } from '../columns';

/** A person with an account. `emailKey` is the address in lower case; it is unique. */
export interface UserModel extends Model<
  InferAttributes<UserModel>,
  InferCreationAttributes<UserModel>
> {
  id: string;
  email: string;
  emailKey: string;
  name: string;
  /** Null until an invited person chose a password. */
  passwordHash: string | null;
  administrator: boolean;
  disabled: boolean;
  createdAt: string;
  lastSignInAt: string | null;
}

/** Binds the table of accounts to a database. */
export function defineUsers(sequelize: Sequelize): ModelStatic<UserModel> {
  return sequelize.define<UserModel>('users', {
    id: key(),
    email: text(),
    emailKey: text(),
    name: text(),
    passwordHash: optionalText(),
    administrator: flag(),
    disabled: flag(),
    createdAt: text(),
    lastSignInAt: optionalText(),
  });
}
