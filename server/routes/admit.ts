import type { Request } from 'express';
import { mayDo, type StudyAction, type StudyRole } from '#shared/permissions';
import { assertNever } from '#shared/core';
import type { Dependencies } from '../dependencies';
import { refuse, type Outcome } from '../errors/server-issue';
import type { User } from '../models/user/user-store';
import { findMembership } from '../services/studies/find-membership';
import { personOf } from '../session/person-of';
import type { Access, OnStudy } from './route';

/** Who calls, as far as the route asks: nothing, a person, or a member with a role on a study. */
export type Caller = Partial<OnStudy>;

/**
 * Lets a request in, or says why not: 401 signed out, 404 for a study that does not exist or that
 * the person is no member of (the same answer), 403 where the role does not allow it.
 */
export async function admit(
  access: Access,
  request: Request,
  dependencies: Dependencies,
): Promise<Outcome<Caller>> {
  const person = personOf(request);
  if (access.kind === 'public') return { ok: true, value: person === null ? {} : { person } };
  if (person === null) return refuse('signInNeeded');
  switch (access.kind) {
    case 'signedIn':
      return { ok: true, value: { person } };
    case 'administrator':
      return person.administrator ? { ok: true, value: { person } } : refuse('administratorNeeded');
    case 'study':
      return admitMember(person, String(request.params.studyId), access.anyOf, dependencies);
    default:
      return assertNever(access);
  }
}

/** Refuses unless the role may do every one of the actions. */
export function requireActions(
  role: StudyRole,
  actions: readonly StudyAction[],
): Outcome<undefined> {
  return actions.every((action) => mayDo(role, action))
    ? { ok: true, value: undefined }
    : refuse('notAllowed');
}

async function admitMember(
  person: User,
  studyId: string,
  anyOf: readonly StudyAction[],
  dependencies: Dependencies,
): Promise<Outcome<Caller>> {
  const membership = await findMembership(dependencies, person.id, studyId);
  if (membership === null) return refuse('notFound');
  if (!anyOf.some((action) => mayDo(membership.role, action))) return refuse('notAllowed');
  return { ok: true, value: { person, ...membership } };
}
