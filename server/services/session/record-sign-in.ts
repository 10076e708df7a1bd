import type { Dependencies } from '../../dependencies';
import type { User } from '../../models/user/user-store';
import { timestamp } from '../../runtime/clock';

/** Notes when a person signed in; gives the account with that time. */
export async function recordSignIn({ database, clock }: Dependencies, person: User): Promise<User> {
  const lastSignInAt = timestamp(clock);
  await database.unitOfWork('site', (unit) =>
    database.stores.users.update(person.id, { lastSignInAt }, unit),
  );
  return { ...person, lastSignInAt };
}
