import type {
  InferAttributes,
  InferCreationAttributes,
  Model,
  ModelStatic,
  Sequelize,
} from 'sequelize';
import { key, optionalText, text } from '../columns';

/** Where a mail went. */
export type MailDelivery = 'outbox' | 'smtp' | 'failed';

/** A mail that was sent. `text` never holds a live link: those are hidden before storing. */
export interface MailModel extends Model<
  InferAttributes<MailModel>,
  InferCreationAttributes<MailModel>
> {
  id: string;
  toAddress: string;
  subject: string;
  text: string;
  sentAt: string;
  delivery: MailDelivery;
  problem: string | null;
}

/** Binds the table of sent mail to a database. */
export function defineMail(sequelize: Sequelize): ModelStatic<MailModel> {
  return sequelize.define<MailModel>('mail', {
    id: key(),
    toAddress: text(),
    subject: text(),
    text: text(),
    sentAt: text(),
    delivery: text(),
    problem: optionalText(),
  });
}
