import { createHash, timingSafeEqual } from 'node:crypto';
import type { FirstAdministratorRequest } from '#shared/api';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { User } from '../../models/user/user-store';
import { addAccount } from '../administration/add-account';
import { passwordWeakness } from './password-weakness';

/** Makes the first account, an administrator's, for whoever has the code printed at start. */
export async function makeFirstAdministrator(
  dependencies: Dependencies,
  request: FirstAdministratorRequest,
): Promise<Outcome<User>> {
  const { database, passwords, firstAdministratorCode } = dependencies;
  if ((await database.stores.users.count()) > 0) return refuse('firstAdministratorExists');
  if (!isSameCode(request.code, firstAdministratorCode)) return refuse('wrongCode');
  const { name, email, password } = request;
  const weakness = passwordWeakness(password, request);
  if (weakness !== null) {
    return refuse('invalidRequest', { fields: [{ path: 'password', message: weakness }] });
  }
  const passwordHash = await passwords.hash(password);
  return database.unitOfWork<Outcome<User>>('site', async (unit) => {
    if ((await database.stores.users.count(unit)) > 0) return refuse('firstAdministratorExists');
    const account = { name, email, administrator: true, passwordHash };
    return { ok: true, value: await addAccount(dependencies, null, account, unit) };
  });
}

/** Blanks, hyphens and case don't matter; the time taken says nothing about the code. */
function isSameCode(given: string, expected: string): boolean {
  const [one, other] = [given, expected].map((code) =>
    createHash('sha256')
      .update(code.toUpperCase().replace(/[^A-Z0-9]/g, ''))
      .digest(),
  );
  return one !== undefined && other !== undefined && timingSafeEqual(one, other);
}
