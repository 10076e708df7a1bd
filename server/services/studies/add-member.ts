import type { NewMemberRequest } from '#shared/api';
import type { Dependencies } from '../../dependencies';
import { refuse, type Outcome } from '../../errors/server-issue';
import type { Study } from '../../models/study/study-store';
import type { Unit } from '../../models/unit-of-work';
import type { User } from '../../models/user/user-store';
import { timestamp } from '../../runtime/clock';
import { addAccount } from '../administration/add-account';
import { postLetter } from '../mail/post-letter';
import { issueToken } from '../session/issue-token';
import { recordStudyChange } from './record-study-change';

/** A person who just got an account must be told how to come in. */
interface Invited {
  readonly person: User;
  readonly link: string | null;
}

/** Makes somebody a member; an address without an account gets one, and an invitation by mail. */
export async function addMember(
  dependencies: Dependencies,
  inviter: User,
  study: Study,
  request: NewMemberRequest,
): Promise<Outcome<undefined>> {
  const { database } = dependencies;
  const added = await database.unitOfWork<Outcome<Invited>>(`study:${study.id}`, async (unit) => {
    const invited = await findOrInvite(dependencies, inviter, request.email, unit);
    const { person } = invited;
    if (person.disabled) return refuse('accountDisabled');
    const present = await database.stores.memberships.find(study.id, person.id, unit);
    if (present !== null) return refuse('memberExists');
    await store(dependencies, inviter, study, person, request, unit);
    return { ok: true, value: invited };
  });
  if (!added.ok) return added;
  sendInvitation(dependencies, inviter, study, added.value);
  return { ok: true, value: undefined };
}

async function findOrInvite(
  dependencies: Dependencies,
  inviter: User,
  email: string,
  unit: Unit,
): Promise<Invited> {
  const known = await dependencies.database.stores.users.findByEmail(email, unit);
  if (known !== null) return { person: known, link: null };
  const name = email.slice(0, email.indexOf('@'));
  const account = { name, email, administrator: false, passwordHash: null };
  const person = await addAccount(dependencies, inviter.id, account, unit);
  return { person, link: await issueToken(dependencies, person.id, 'invitation', unit) };
}

async function store(
  dependencies: Dependencies,
  inviter: User,
  study: Study,
  person: User,
  { role }: NewMemberRequest,
  unit: Unit,
): Promise<void> {
  const membership = {
    studyId: study.id,
    userId: person.id,
    role,
    createdAt: timestamp(dependencies.clock),
  };
  await dependencies.database.stores.memberships.insert(membership, unit);
  const after = { person: person.id, role };
  const change = { studyId: study.id, personId: inviter.id, what: 'member.added' };
  await recordStudyChange(dependencies, { ...change, before: null, after }, unit);
}

function sendInvitation(
  dependencies: Dependencies,
  inviter: User,
  study: Study,
  { person, link }: Invited,
): void {
  if (link === null) return;
  const { name, email } = person;
  const address = dependencies.config.publicUrl;
  const facts = { name, email, inviter: inviter.name, study: study.title, link, address };
  dependencies.background.run('An invitation to a study', () =>
    postLetter(dependencies, email, 'study-invitation', facts),
  );
}
