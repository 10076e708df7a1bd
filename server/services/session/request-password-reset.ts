import type { Dependencies } from '../../dependencies';
import { postLetter } from '../mail/post-letter';
import { issueToken } from './issue-token';

/**
 * Mails a link to set a new password, if such an account exists and is not switched off.
 *
 * The answer does not wait for any of it, so that neither its words nor its time tell whether the
 * account exists.
 */
export function requestPasswordReset(dependencies: Dependencies, email: string): void {
  dependencies.background.run('A password reset', () => mailLink(dependencies, email));
}

async function mailLink(dependencies: Dependencies, email: string): Promise<void> {
  const { database } = dependencies;
  const person = await database.stores.users.findByEmail(email);
  if (person === null || person.disabled) return;
  const link = await database.unitOfWork('site', (unit) =>
    issueToken(dependencies, person.id, 'passwordReset', unit),
  );
  await postLetter(dependencies, person.email, 'password-reset', { name: person.name, link });
}
