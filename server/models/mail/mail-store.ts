import type { InferAttributes, ModelStatic, Sequelize } from 'sequelize';
import { plain, within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineMail, type MailModel } from './mail-model';

/** A sent mail as stored, without its live links. */
export type StoredMail = Readonly<InferAttributes<MailModel>>;

/** Reads and writes what was mailed. */
export class MailStore {
  private readonly mail: ModelStatic<MailModel>;

  constructor(sequelize: Sequelize) {
    this.mail = defineMail(sequelize);
  }

  async insert(mail: StoredMail, unit: Unit): Promise<void> {
    await this.mail.create(mail, within(unit));
  }

  /** The newest mails first, at most so many. */
  async newest(limit: number): Promise<readonly StoredMail[]> {
    const order: [string, string][] = [
      ['sentAt', 'DESC'],
      ['id', 'DESC'],
    ];
    return (await this.mail.findAll({ order, limit })).map(plain);
  }
}
