import type { PasswordChangeRequest } from '#shared/api';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import { emailKey, type User } from '../../models/user/user-store';
import { announcePasswordChange, hashNewPassword, storePassword } from './set-password';

/** Changes a person's own password. All their other sessions end; guessing is slowed down. */
export async function changePassword(
  dependencies: Dependencies,
  person: User,
  request: PasswordChangeRequest,
  presentSession: string | null,
): Promise<Outcome<undefined>> {
  const proven = await provePassword(dependencies, person, request.currentPassword);
  if (!proven.ok) return proven;
  const hash = await hashNewPassword(dependencies, person, request.newPassword);
  if (!hash.ok) return hash;
  await dependencies.database.unitOfWork('site', (unit) =>
    storePassword(dependencies, person, hash.value, presentSession, unit),
  );
  announcePasswordChange(dependencies, person);
  return { ok: true, value: undefined };
}

async function provePassword(
  { backOff, passwords }: Dependencies,
  person: User,
  currentPassword: string,
): Promise<Outcome<undefined>> {
  const name = emailKey(person.email);
  const seconds = backOff.secondsToWait(name);
  if (seconds > 0) return refuse('signInBlocked', { facts: { seconds } });
  backOff.recordFailure(name);
  if (!(await passwords.verify(person.passwordHash, currentPassword)))
    return refuse('wrongPassword');
  backOff.forget(name);
  return { ok: true, value: undefined };
}
