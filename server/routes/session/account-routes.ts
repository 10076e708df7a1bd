import {
  firstAdministratorRequestSchema,
  passwordChangeRequestSchema,
  passwordResetCompletionSchema,
  passwordResetRequestSchema,
  sessionViewSchema,
} from '#shared/api';
import type {
  FirstAdministratorRequest,
  PasswordChangeRequest,
  PasswordResetCompletion,
  PasswordResetRequest,
  SessionView,
} from '#shared/api';
import type { Outcome } from '../../errors/server-issue';
import { changePassword } from '../../services/session/change-password';
import { completePasswordReset } from '../../services/session/complete-password-reset';
import { makeFirstAdministrator } from '../../services/session/make-first-administrator';
import { recordSignIn } from '../../services/session/record-sign-in';
import { requestPasswordReset } from '../../services/session/request-password-reset';
import { viewSession } from '../../services/session/view-session';
import { empty, json, publicRoute, signedInRoute } from '../define-route';
import type { ByPerson, Call, Route } from '../route';

/** The first account, and passwords. */
export const accountRoutes: readonly Route[] = [
  publicRoute({
    method: 'post',
    path: '/api/first-administrator',
    summary: 'Makes the first administrator with the code printed at start, and signs them in.',
    body: firstAdministratorRequestSchema,
    reply: json(sessionViewSchema, 201),
    limit: 'guess',
    handle: beginAsAdministrator,
  }),
  signedInRoute({
    method: 'post',
    path: '/api/password-changes',
    summary: 'Changes the own password; every other session of the person ends.',
    body: passwordChangeRequestSchema,
    reply: empty(),
    limit: 'guess',
    handle: replacePassword,
  }),
  publicRoute({
    method: 'post',
    path: '/api/password-resets',
    summary: 'Mails a link to set a new password, if there is such an account.',
    body: passwordResetRequestSchema,
    reply: empty(202),
    limit: 'mail',
    handle: mailResetLink,
  }),
  publicRoute({
    method: 'post',
    path: '/api/password-resets/completion',
    summary: 'Sets the password of whoever holds a mailed link.',
    body: passwordResetCompletionSchema,
    reply: empty(),
    limit: 'guess',
    handle: setPassword,
  }),
];

async function beginAsAdministrator({
  dependencies,
  session,
  body,
}: Call<unknown, FirstAdministratorRequest>): Promise<Outcome<SessionView>> {
  const made = await makeFirstAdministrator(dependencies, body);
  if (!made.ok) return made;
  const person = await recordSignIn(dependencies, made.value);
  await session.begin(person);
  session.issueForgeryToken();
  return { ok: true, value: await viewSession(dependencies, person) };
}

function replacePassword(
  call: Call<unknown, PasswordChangeRequest> & ByPerson,
): Promise<Outcome<undefined>> {
  return changePassword(call.dependencies, call.person, call.body, call.session.id());
}

function mailResetLink({
  dependencies,
  body,
}: Call<unknown, PasswordResetRequest>): Promise<Outcome<undefined>> {
  requestPasswordReset(dependencies, body.email);
  return Promise.resolve({ ok: true, value: undefined });
}

function setPassword({
  dependencies,
  body,
}: Call<unknown, PasswordResetCompletion>): Promise<Outcome<undefined>> {
  return completePasswordReset(dependencies, body);
}
