import type { Request, RequestHandler, Response } from 'express';
import session from 'express-session';
import passport from 'passport';
import { Strategy as LocalStrategy } from 'passport-local';
import type { Dependencies } from '../dependencies';
import type { Outcome } from '../errors/server-issue';
import type { User } from '../models/user/user-store';
import { timestamp } from '../runtime/clock';
import {
  browserSessions,
  sessionCookieName,
  type BrowserSession,
  type People,
} from './browser-session';
import { QueuedSessionStore } from './queued-session-store';
import { IDLE_LIMIT_IN_MILLISECONDS, isDueForRenewal } from './session-data';

/** What an address and a password are checked with. */
export type VerifyCredentials = (
  dependencies: Dependencies,
  credentials: { readonly email: string; readonly password: string },
) => Promise<Outcome<User>>;

/** Sessions of an application. */
export interface Sessions {
  /** Tell who is signed in, in this order. Nothing is stored before somebody signs in. */
  readonly handlers: readonly RequestHandler[];
  readonly sessionOf: (request: Request, response: Response) => BrowserSession;
  /** Ends the timer that clears old sessions. */
  readonly stop: () => void;
}

/** Sets up sessions in the application's database and signing in by address and password. */
export function createSessions(dependencies: Dependencies, verify: VerifyCredentials): Sessions {
  const store = new QueuedSessionStore(dependencies.database, dependencies.clock);
  const people = new passport.Passport();
  rememberById(people, dependencies);
  people.use(localStrategy(dependencies, verify));
  return {
    handlers: [
      readCookie(dependencies, store),
      people.session() as RequestHandler,
      renew(dependencies),
    ],
    sessionOf: browserSessions(dependencies, people),
    stop: () => {
      store.stopExpiringSessions();
    },
  };
}

function rememberById(people: People, dependencies: Dependencies): void {
  people.serializeUser((user, done) => {
    done(null, (user as User).id);
  });
  people.deserializeUser((id: string, done) => {
    findEnabled(dependencies, id).then(
      (user) => {
        done(null, user ?? false);
      },
      (problem: unknown) => {
        done(problem);
      },
    );
  });
}

async function findEnabled({ database }: Dependencies, id: string): Promise<User | null> {
  const user = await database.stores.users.findById(id);
  return user === null || user.disabled ? null : user;
}

function localStrategy(dependencies: Dependencies, verify: VerifyCredentials): LocalStrategy {
  return new LocalStrategy({ usernameField: 'email', session: false }, (email, password, done) => {
    verify(dependencies, { email, password }).then(
      (outcome) => {
        if (outcome.ok) done(null, outcome.value);
        else done(null, false, outcome.issue as unknown as { message: string });
      },
      (problem: unknown) => {
        done(problem);
      },
    );
  });
}

function readCookie({ config, secrets }: Dependencies, store: QueuedSessionStore): RequestHandler {
  return session({
    name: sessionCookieName(config),
    secret: secrets.session,
    store,
    resave: false,
    saveUninitialized: false,
    cookie: {
      httpOnly: true,
      sameSite: 'lax',
      secure: config.publicUrl.startsWith('https:'),
      path: '/',
      maxAge: IDLE_LIMIT_IN_MILLISECONDS,
    },
  });
}

function renew({ clock }: Dependencies): RequestHandler {
  return (request, _response, next) => {
    if (request.isAuthenticated() && isDueForRenewal(request.session, clock.now())) {
      request.session.renewedAt = timestamp(clock);
    }
    next();
  };
}
