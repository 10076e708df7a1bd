import type { Dependencies } from '../server/dependencies';
import type { User } from '../server/models/user/user-store';
import { addDemonstrationAccount } from '../server/services/demonstration/add-demonstration-account';
import { markAsDemonstration } from '../server/services/demonstration/demonstration';
import { DEMONSTRATION_ACCOUNTS, DEMONSTRATION_PASSWORD } from './accounts';
import type { DemonstrationAccount } from './accounts';

/** A demonstration account as stored. */
export interface SeededAccount extends DemonstrationAccount {
  readonly user: User;
}

/** Makes the demonstration accounts and marks the database as seeded for demonstration. */
export async function seedAccounts(dependencies: Dependencies): Promise<readonly SeededAccount[]> {
  const seeded: SeededAccount[] = [];
  for (const account of DEMONSTRATION_ACCOUNTS) {
    const { name, email, role } = account;
    const administrator = role === 'administrator';
    const facts = { name, email, administrator, password: DEMONSTRATION_PASSWORD };
    seeded.push({ ...account, user: await addDemonstrationAccount(dependencies, facts) });
  }
  const accounts = seeded.map(({ email, role }) => ({ email, role }));
  await markAsDemonstration(dependencies, { accounts, password: DEMONSTRATION_PASSWORD });
  return seeded;
}
