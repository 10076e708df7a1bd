import type { Dependencies } from '../../dependencies';
import { refuseField, type Outcome } from '../../errors/server-issue';
import type { Unit } from '../../models/unit-of-work';
import { emailKey, type User } from '../../models/user/user-store';
import { timestamp } from '../../runtime/clock';
import { postLetter } from '../mail/post-letter';
import { appendToTrail } from '../trail/append-to-trail';
import { passwordWeakness } from './password-weakness';

/** The hash of a new password, or the refusal of one that would be guessed first. */
export async function hashNewPassword(
  { passwords }: Dependencies,
  person: Pick<User, 'name' | 'email'>,
  newPassword: string,
): Promise<Outcome<string>> {
  const weakness = passwordWeakness(newPassword, person);
  if (weakness !== null) return refuseField('newPassword', weakness);
  return { ok: true, value: await passwords.hash(newPassword) };
}

/**
 * Stores a new password: mailed links of the person stop working and their sessions end, except
 * the one to keep.
 */
export async function storePassword(
  dependencies: Dependencies,
  person: User,
  passwordHash: string,
  keepSession: string | null,
  unit: Unit,
): Promise<void> {
  const { database, clock, backOff } = dependencies;
  const { users, sessions, tokens } = database.stores;
  await users.update(person.id, { passwordHash }, unit);
  await sessions.endAllOf(person.id, keepSession, unit);
  await tokens.useUpAllOf(person.id, timestamp(clock), unit);
  const change = { chain: 'site', personId: person.id, before: null, after: { person: person.id } };
  await appendToTrail(dependencies, { ...change, what: 'account.passwordSet' }, unit);
  backOff.forget(emailKey(person.email));
}

/** Tells a person by mail that their password was changed. */
export function announcePasswordChange(dependencies: Dependencies, person: User): void {
  const facts = { name: person.name, address: dependencies.config.publicUrl };
  dependencies.background.run('Mail about a changed password', () =>
    postLetter(dependencies, person.email, 'password-changed', facts),
  );
}
