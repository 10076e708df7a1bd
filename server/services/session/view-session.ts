import type { SessionView } from '#shared/api';
import type { Dependencies } from '../../dependencies';
import type { User } from '../../models/user/user-store';
import { readDemonstration } from '../demonstration/demonstration';
import { presentPerson } from './present-person';

/** What a browser needs to know, signed in or not. */
export async function viewSession(
  dependencies: Dependencies,
  person: User | null,
): Promise<SessionView> {
  const demonstration = await readDemonstration(dependencies);
  return {
    person: person === null ? null : presentPerson(person),
    firstAdministratorNeeded: (await dependencies.database.stores.users.count()) === 0,
    demonstrationAccounts: demonstration === null ? [] : [...demonstration.accounts],
    demonstrationPassword: demonstration?.password ?? null,
  };
}
