import { sessionViewSchema, signInRequestSchema } from '#shared/api';
import type { SessionView, SignInRequest } from '#shared/api';
import type { Outcome } from '../../errors/server-issue';
import { recordSignIn } from '../../services/session/record-sign-in';
import { viewSession } from '../../services/session/view-session';
import { empty, json, publicRoute } from '../define-route';
import type { ByPerson, Call, Route } from '../route';

/** Signing in and out. */
export const sessionRoutes: readonly Route[] = [
  publicRoute({
    method: 'get',
    path: '/api/session',
    summary: 'Says who is signed in, and sends the token that unsafe requests must echo.',
    reply: json(sessionViewSchema),
    handle: showSession,
  }),
  publicRoute({
    method: 'post',
    path: '/api/session',
    summary: 'Signs a person in.',
    body: signInRequestSchema,
    reply: json(sessionViewSchema),
    limit: 'guess',
    handle: signIn,
  }),
  publicRoute({
    method: 'delete',
    path: '/api/session',
    summary: 'Signs out; fine also when nobody is signed in.',
    reply: empty(),
    handle: signOut,
  }),
];
async function showSession({
  dependencies,
  session,
  person,
}: Call & Partial<ByPerson>): Promise<Outcome<SessionView>> {
  session.issueForgeryToken();
  return { ok: true, value: await viewSession(dependencies, person ?? null) };
}

async function signIn({
  dependencies,
  session,
}: Call<unknown, SignInRequest>): Promise<Outcome<SessionView>> {
  const found = await session.authenticate();
  if (!found.ok) return found;
  const person = await recordSignIn(dependencies, found.value);
  await session.begin(person);
  session.issueForgeryToken();
  return { ok: true, value: await viewSession(dependencies, person) };
}

async function signOut({ session }: Call): Promise<Outcome<undefined>> {
  await session.end();
  session.issueForgeryToken();
  return { ok: true, value: undefined };
}
