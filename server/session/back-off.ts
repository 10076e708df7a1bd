import type { Clock } from '../runtime/clock';

const FREE_FAILURES = 5;
const LONGEST_WAIT_IN_SECONDS = 300;
const FORGOTTEN_AFTER_IN_SECONDS = 3600;
const MOST_NAMES = 10_000;

/** Slows down guessing: after a few failures each further one doubles the wait. */
export interface BackOff {
  /** Seconds still to wait before the next attempt for this name; 0 for none. */
  readonly secondsToWait: (name: string) => number;
  readonly recordFailure: (name: string) => void;
  readonly forget: (name: string) => void;
}

interface Failures {
  readonly count: number;
  readonly lastAt: number;
}

/**
 * Counts failures by name in memory, whether or not an account has that name, so that nobody
 * learns which accounts exist. The wait stays short enough not to lock a person out for long.
 */
export function createBackOff(clock: Clock): BackOff {
  const failures = new Map<string, Failures>();
  const nowInSeconds = (): number => clock.now().getTime() / 1000;
  return {
    secondsToWait: (name) => {
      const known = failures.get(name);
      if (known === undefined || known.count < FREE_FAILURES) return 0;
      const until = known.lastAt + waitInSeconds(known.count);
      return Math.max(0, Math.ceil(until - nowInSeconds()));
    },
    recordFailure: (name) => {
      const count = recentCount(failures.get(name), nowInSeconds());
      failures.delete(name);
      failures.set(name, { count: count + 1, lastAt: nowInSeconds() });
      dropOldest(failures);
    },
    forget: (name) => {
      failures.delete(name);
    },
  };
}

function waitInSeconds(count: number): number {
  return Math.min(LONGEST_WAIT_IN_SECONDS, 2 ** (count - FREE_FAILURES + 1));
}

function recentCount(known: Failures | undefined, now: number): number {
  if (known === undefined || now - known.lastAt > FORGOTTEN_AFTER_IN_SECONDS) return 0;
  return known.count;
}

/** A map keeps the order of insertion, so the first is the one that failed longest ago. */
function dropOldest(failures: Map<string, Failures>): void {
  const oldest = failures.keys().next();
  if (failures.size > MOST_NAMES && oldest.done !== true) failures.delete(oldest.value);
}
