import type { SessionData } from 'express-session';

declare module 'express-session' {
  interface SessionData {
    /** When the person signed in (ISO 8601). */
    signedInAt?: string;
    /** When the session was last written to prolong it. */
    renewedAt?: string;
    /** Whom it belongs to, as passport keeps it. */
    passport?: { readonly user?: string };
  }
}

const HOUR_IN_MILLISECONDS = 3_600_000;

/** A session ends after so long without a request. */
export const IDLE_LIMIT_IN_MILLISECONDS = 12 * HOUR_IN_MILLISECONDS;

/** A session ends so long after signing in, used or not. */
export const AGE_LIMIT_IN_MILLISECONDS = 7 * 24 * HOUR_IN_MILLISECONDS;

/** Prolonging writes to the database, so it happens at most so often. */
export const RENEWAL_IN_MILLISECONDS = 5 * 60 * 1000;

/** Whether a stored session may no longer be used. */
export function isOver(session: SessionData, now: Date): boolean {
  const age = millisecondsSince(session.signedInAt, now);
  const idle = millisecondsSince(session.renewedAt, now);
  return age > AGE_LIMIT_IN_MILLISECONDS || idle > IDLE_LIMIT_IN_MILLISECONDS;
}

/** Whether the session is old enough to be prolonged. */
export function isDueForRenewal(session: SessionData, now: Date): boolean {
  return millisecondsSince(session.renewedAt, now) > RENEWAL_IN_MILLISECONDS;
}

/** A session that was just begun has its row still to be made. */
export function isNew(session: SessionData): boolean {
  return session.renewedAt === session.signedInAt;
}

function millisecondsSince(time: string | undefined, now: Date): number {
  return time === undefined ? 0 : now.getTime() - new Date(time).getTime();
}
