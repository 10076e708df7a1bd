import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import { emailKey, type User } from '../../models/user/user-store';

/** An address and a password as typed. */
export interface Credentials {
  readonly email: string;
  readonly password: string;
}

/**
 * Finds whose credentials these are.
 *
 * Unknown, disabled and invited accounts get the same answer as a wrong password, after the same
 * work. While an account has to wait, the password is not even looked at (`signInBlocked`).
 */
export async function verifyCredentials(
  { database, passwords, backOff }: Dependencies,
  { email, password }: Credentials,
): Promise<Outcome<User>> {
  const name = emailKey(email);
  const seconds = backOff.secondsToWait(name);
  if (seconds > 0) return refuse('signInBlocked', { facts: { seconds } });
  backOff.recordFailure(name);
  const user = await database.stores.users.findByEmail(email);
  const usable = user !== null && !user.disabled ? user : null;
  const matches = await passwords.verify(usable?.passwordHash ?? null, password);
  if (usable === null || !matches) return refuse('signInFailed');
  backOff.forget(name);
  return { ok: true, value: usable };
}
