import type { PasswordResetCompletion } from '#shared/api';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { Unit } from '../../models/unit-of-work';
import type { User } from '../../models/user/user-store';
import { timestamp } from '../../runtime/clock';
import { hashToken } from './issue-token';
import { announcePasswordChange, hashNewPassword, storePassword } from './set-password';

/** Sets the password of whoever holds a mailed link; the link works once, all sessions end. */
export async function completePasswordReset(
  dependencies: Dependencies,
  { token, newPassword }: PasswordResetCompletion,
): Promise<Outcome<undefined>> {
  const person = await bearerOf(dependencies, token);
  if (person === null) return refuse('linkNotUsable');
  const hash = await hashNewPassword(dependencies, person, newPassword);
  if (!hash.ok) return hash;
  const stored = await dependencies.database.unitOfWork<Outcome<undefined>>(
    'site',
    async (unit) => {
      if ((await bearerOf(dependencies, token, unit)) === null) return refuse('linkNotUsable');
      await storePassword(dependencies, person, hash.value, null, unit);
      return { ok: true, value: undefined };
    },
  );
  if (stored.ok) announcePasswordChange(dependencies, person);
  return stored;
}

async function bearerOf(
  { database, clock }: Dependencies,
  token: string,
  unit?: Unit,
): Promise<User | null> {
  const found = await database.stores.tokens.find(hashToken(token), unit);
  const isOpen = found?.usedAt === null && found.expiresAt > timestamp(clock);
  if (!isOpen) return null;
  const person = await database.stores.users.findById(found.userId, unit);
  return person?.disabled === false ? person : null;
}
