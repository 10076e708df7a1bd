import type { Request, Response } from 'express';
import type passport from 'passport';
import type { Configuration } from '../config';
import type { Dependencies } from '../dependencies';
import type { Outcome, ServerIssue } from '../errors/server-issue';
import type { User } from '../models/user/user-store';
import { timestamp } from '../runtime/clock';
import { issueForgeryToken } from './forgery';

/** Passport of one application. */
export type People = InstanceType<typeof passport.Passport>;

/** The session of the browser that made a request. */
export interface BrowserSession {
  /** Its id while somebody is signed in. */
  readonly id: () => string | null;
  /** Who the address and password in the body belong to. */
  readonly authenticate: () => Promise<Outcome<User>>;
  /** Signs a person in under a new session id; whatever id the browser had before is void. */
  readonly begin: (person: User) => Promise<void>;
  readonly end: () => Promise<void>;
  /** Sends the token that unsafe requests must echo. */
  readonly issueForgeryToken: () => void;
}

/** Binds the session's port to requests. */
export function browserSessions(
  dependencies: Dependencies,
  people: People,
): (request: Request, response: Response) => BrowserSession {
  return (request, response) => ({
    id: () => (request.isAuthenticated() ? request.sessionID : null),
    authenticate: () => authenticate(people, request, response),
    begin: (person) => begin(request, person, timestamp(dependencies.clock)),
    end: () => end(request, response, dependencies.config),
    issueForgeryToken: () => {
      issueForgeryToken(request, response, dependencies);
    },
  });
}

/** The name of the session's cookie; over https its name makes the browser guard its scope. */
export function sessionCookieName({ publicUrl }: Configuration): string {
  return publicUrl.startsWith('https:') ? '__Host-evenhand' : 'evenhand';
}

type Authenticated = (
  problem: unknown,
  user: User | false | undefined,
  issue: ServerIssue | undefined,
) => void;

function authenticate(
  people: People,
  request: Request,
  response: Response,
): Promise<Outcome<User>> {
  return new Promise((resolve, reject) => {
    const decided: Authenticated = (problem, user, issue) => {
      if (problem !== null && problem !== undefined)
        reject(problem instanceof Error ? problem : new Error('No answer.'));
      else if (user === false || user === undefined) {
        resolve({ ok: false, issue: issue ?? { code: 'signInFailed' } });
      } else resolve({ ok: true, value: user });
    };
    const handler = people.authenticate('local', decided) as (...given: unknown[]) => void;
    handler(request, response, reject);
  });
}

/** Passport makes a new session id itself, so that one planted before is of no use. */
async function begin(request: Request, person: User, at: string): Promise<void> {
  await called((done) => {
    request.logIn(person, done);
  });
  request.session.signedInAt = at;
  request.session.renewedAt = at;
}

async function end(request: Request, response: Response, config: Configuration): Promise<void> {
  await called((done) => {
    request.session.destroy(done);
  });
  request.user = undefined;
  response.clearCookie(sessionCookieName(config));
}

function called(act: (done: (problem?: unknown) => void) => void): Promise<void> {
  return new Promise((resolve, reject) => {
    act((problem) => {
      if (problem === null || problem === undefined) resolve();
      else reject(problem instanceof Error ? problem : new Error('The session did not answer.'));
    });
  });
}
