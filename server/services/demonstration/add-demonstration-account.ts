import type { Dependencies } from '../../dependencies';
import type { User } from '../../models/user/user-store';
import { addAccount } from '../administration/add-account';

/** An account of the demonstration, with its documented password. */
export interface DemonstrationAccount {
  readonly name: string;
  readonly email: string;
  readonly password: string;
  readonly administrator: boolean;
}

/** Adds an account that can sign in at once, without an invitation. */
export async function addDemonstrationAccount(
  dependencies: Dependencies,
  { name, email, password, administrator }: DemonstrationAccount,
): Promise<User> {
  const passwordHash = await dependencies.passwords.hash(password);
  return dependencies.database.unitOfWork('site', (unit) =>
    addAccount(dependencies, null, { name, email, administrator, passwordHash }, unit),
  );
}
