import type { Account, OutboxMail } from '#shared/api';
import type { StoredMail } from '../../models/mail/mail-store';
import type { User } from '../../models/user/user-store';

/** An account as administrators see it. */
export function presentAccount(user: User): Account {
  const { id, name, email, administrator, disabled, createdAt, lastSignInAt } = user;
  return { id, name, email, administrator, disabled, createdAt, lastSignInAt };
}

/** A mail as administrators see it. */
export function presentMail(mail: StoredMail): OutboxMail {
  const { id, toAddress, subject, text, sentAt, delivery } = mail;
  return { id, to: toAddress, subject, text, sentAt, delivery };
}
