import type { Dependencies } from '../../dependencies';
import type { Unit } from '../../models/unit-of-work';
import { emailKey, type User } from '../../models/user/user-store';
import { timestamp } from '../../runtime/clock';
import { appendToTrail } from '../trail/append-to-trail';

/** What makes an account; without a password its person must be invited. */
export interface NewAccount {
  readonly name: string;
  readonly email: string;
  readonly administrator: boolean;
  readonly passwordHash: string | null;
}

/** Adds an account, in an open unit. The caller has made sure that the address is free. */
export async function addAccount(
  dependencies: Dependencies,
  addedBy: string | null,
  account: NewAccount,
  unit: Unit,
): Promise<User> {
  const { database, clock, ids } = dependencies;
  const state = { disabled: false, createdAt: timestamp(clock), lastSignInAt: null };
  const user = { id: ids.next(), ...account, ...state };
  await database.stores.users.insert(user, unit);
  const { name, email, administrator } = account;
  const after = { person: user.id, name, email, administrator };
  const change = { chain: 'site', personId: addedBy, what: 'account.added', before: null, after };
  await appendToTrail(dependencies, change, unit);
  return { ...user, emailKey: emailKey(email) };
}
