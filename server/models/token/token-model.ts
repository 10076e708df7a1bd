import type {
  InferAttributes,
  InferCreationAttributes,
  Model,
  ModelStatic,
  Sequelize,
} from 'sequelize';
import { key, optionalText, text } from '../columns';

/** What a mailed token lets its bearer do. */
export type TokenPurpose = 'passwordReset' | 'invitation';

/** A mailed token; only its hash is kept. */
export interface TokenModel extends Model<
  InferAttributes<TokenModel>,
  InferCreationAttributes<TokenModel>
> {
  hash: string;
  purpose: TokenPurpose;
  userId: string;
  createdAt: string;
  expiresAt: string;
  usedAt: string | null;
}

/** Binds the table of tokens to a database. */
export function defineTokens(sequelize: Sequelize): ModelStatic<TokenModel> {
  return sequelize.define<TokenModel>('tokens', {
    hash: key(),
    purpose: text(),
    userId: text(),
    createdAt: text(),
    expiresAt: text(),
    usedAt: optionalText(),
  });
}
