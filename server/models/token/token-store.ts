import type { InferAttributes, ModelStatic, Sequelize } from 'sequelize';
import { plainOrNull, within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineTokens, type TokenModel } from './token-model';

/** A mailed token as stored: its hash only. */
export type Token = Readonly<InferAttributes<TokenModel>>;

/** Reads and writes the hashes of mailed tokens. */
export class TokenStore {
  private readonly tokens: ModelStatic<TokenModel>;

  constructor(sequelize: Sequelize) {
    this.tokens = defineTokens(sequelize);
  }

  async insert(token: Token, unit: Unit): Promise<void> {
    await this.tokens.create(token, within(unit));
  }

  async find(hash: string, unit?: Unit): Promise<Token | null> {
    return plainOrNull(await this.tokens.findByPk(hash, within(unit)));
  }

  /** Uses up every open token of a person, whatever it was for. */
  async useUpAllOf(userId: string, at: string, unit: Unit): Promise<void> {
    await this.tokens.update({ usedAt: at }, { where: { userId, usedAt: null }, ...within(unit) });
  }
}
