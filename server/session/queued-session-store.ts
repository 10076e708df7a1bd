import sequelizeStore from 'connect-session-sequelize';
import session, { type SessionData } from 'express-session';
import type { Database } from '../models/database';
import type { Clock } from '../runtime/clock';
import { IDLE_LIMIT_IN_MILLISECONDS, isNew, isOver } from './session-data';

const SequelizeStore = sequelizeStore(session.Store);
const CLEARING_IN_MILLISECONDS = 15 * 60 * 1000;

/**
 * Sessions in the application's database. Its writes wait in the same queue as all others, an old
 * session is not found, and a session that was ended meanwhile is not written back.
 */
export class QueuedSessionStore extends SequelizeStore {
  constructor(
    private readonly database: Database,
    private readonly clock: Clock,
  ) {
    super(storeOptions(database));
  }

  override get(sid: string, done: (problem: unknown, found?: SessionData | null) => void): void {
    super.get(sid, (problem: unknown, found) => {
      const usable = found !== null && found !== undefined && !isOver(found, this.clock.now());
      done(problem, usable ? found : null);
    });
  }

  override set(sid: string, data: SessionData, done?: (problem?: unknown) => void): void {
    const write = isNew(data)
      ? (): Promise<void> =>
          settled((settle) => {
            super.set(sid, data, settle);
          })
      : (): Promise<void> => this.rewrite(sid, data);
    this.enqueue(write, done);
  }

  override destroy(sid: string, done?: (problem?: unknown) => void): void {
    this.enqueue(
      () =>
        settled((settle) => {
          super.destroy(sid, settle);
        }),
      done,
    );
  }

  private rewrite(sid: string, data: SessionData): Promise<void> {
    const { sessions } = this.database.stores;
    const expires = new Date(this.clock.now().getTime() + IDLE_LIMIT_IN_MILLISECONDS);
    return sessions.updateExisting(sid, JSON.stringify(data), expires);
  }

  private enqueue(write: () => Promise<void>, done?: (problem?: unknown) => void): void {
    this.database.queue.run(write).then(
      () => done?.(),
      (problem: unknown) => done?.(problem),
    );
  }
}

function storeOptions(database: Database): ConstructorParameters<typeof SequelizeStore>[0] {
  const options = {
    db: database.sequelize,
    table: 'sessions',
    disableTouch: true,
    checkExpirationInterval: CLEARING_IN_MILLISECONDS,
    extendDefaultFields: (fields: { data: string; expires: Date }, data: SessionData) => ({
      ...fields,
      userId: data.passport?.user ?? null,
    }),
  };
  return options;
}

function settled(act: (settle: (problem?: unknown) => void) => void): Promise<void> {
  return new Promise((resolve, reject) => {
    act((problem) => {
      if (problem === undefined || problem === null) resolve();
      else reject(problem instanceof Error ? problem : new Error('The session was not stored.'));
    });
  });
}
