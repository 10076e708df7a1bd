import type { NewAccountRequest } from '#shared/api';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { User } from '../../models/user/user-store';
import { postLetter } from '../mail/post-letter';
import { issueToken } from '../session/issue-token';
import { addAccount } from './add-account';

/** Makes an account and mails its person a link to choose a password. */
export async function createAccount(
  dependencies: Dependencies,
  inviter: User,
  request: NewAccountRequest,
): Promise<Outcome<User>> {
  const made = await dependencies.database.unitOfWork('site', async (unit) => {
    const { users } = dependencies.database.stores;
    if ((await users.findByEmail(request.email, unit)) !== null) return refuse('emailTaken');
    const account = { ...request, passwordHash: null };
    const user = await addAccount(dependencies, inviter.id, account, unit);
    const link = await issueToken(dependencies, user.id, 'invitation', unit);
    return { ok: true, value: { user, link } } as const;
  });
  if (!made.ok) return made;
  const { user, link } = made.value;
  sendInvitation(dependencies, inviter, user, link);
  return { ok: true, value: user };
}

function sendInvitation(
  dependencies: Dependencies,
  inviter: User,
  { name, email }: User,
  link: string,
): void {
  const address = dependencies.config.publicUrl;
  const facts = { name, email, inviter: inviter.name, link, address };
  dependencies.background.run('An invitation', () =>
    postLetter(dependencies, email, 'invitation', facts),
  );
}
