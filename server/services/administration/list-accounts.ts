import type { Dependencies } from '../../dependencies';
import type { User } from '../../models/user/user-store';

/** All accounts, by name. */
export function listAccounts({ database }: Dependencies): Promise<readonly User[]> {
  return database.stores.users.list();
}
