import type { AccountChangeRequest } from '#shared/api';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { Unit } from '../../models/unit-of-work';
import type { User, UserChange } from '../../models/user/user-store';
import { appendToTrail } from '../trail/append-to-trail';

/**
 * Changes the name of an account, switches it off or on, makes its person an administrator or not.
 *
 * Switching it off ends its sessions. The last administrator who can sign in stays one.
 */
export async function changeAccount(
  dependencies: Dependencies,
  administrator: User,
  personId: string,
  request: AccountChangeRequest,
): Promise<Outcome<User>> {
  const { database } = dependencies;
  return database.unitOfWork<Outcome<User>>('site', async (unit) => {
    const before = await database.stores.users.findById(personId, unit);
    if (before === null) return refuse('notFound');
    const after = { ...before, ...withoutGaps(request) };
    await database.stores.users.update(personId, withoutGaps(request), unit);
    if (await leavesNobody(dependencies, before, unit)) return refuse('lastAdministrator');
    if (after.disabled) await database.stores.sessions.endAllOf(personId, null, unit);
    await record(dependencies, administrator, before, after, unit);
    return { ok: true, value: after };
  });
}

async function leavesNobody(
  { database }: Dependencies,
  before: User,
  unit: Unit,
): Promise<boolean> {
  const wasOne = before.administrator && !before.disabled;
  return wasOne && (await database.stores.users.countAdministrators(unit)) === 0;
}

async function record(
  dependencies: Dependencies,
  administrator: User,
  before: User,
  after: User,
  unit: Unit,
): Promise<void> {
  const change = {
    chain: 'site',
    personId: administrator.id,
    what: 'account.changed',
    before: recorded(before),
    after: recorded(after),
  };
  await appendToTrail(dependencies, change, unit);
}

function recorded({ id, name, administrator, disabled }: User): Record<string, unknown> {
  return { person: id, name, administrator, disabled };
}

/** Only what the request really says; what it leaves out stays. */
function withoutGaps({ name, administrator, disabled }: AccountChangeRequest): UserChange {
  return {
    ...(name === undefined ? {} : { name }),
    ...(administrator === undefined ? {} : { administrator }),
    ...(disabled === undefined ? {} : { disabled }),
  };
}
