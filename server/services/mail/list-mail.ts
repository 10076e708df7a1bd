import type { Dependencies } from '../../dependencies';
import type { StoredMail } from '../../models/mail/mail-store';

const MOST_MAILS = 200;

/** The newest mails, at most two hundred, without their live links. */
export function listMail({ database }: Dependencies): Promise<readonly StoredMail[]> {
  return database.stores.mail.newest(MOST_MAILS);
}
