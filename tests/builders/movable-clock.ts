import type { Clock } from '../../server/runtime/clock';

/** A clock that stands still until it is moved. */
export interface MovableClock extends Clock {
  readonly moveBy: (seconds: number) => void;
}

/** Starts at the present moment, because the age of cookies is counted by the real clock. */
export function movableClock(): MovableClock {
  let now = Date.now();
  return {
    now: () => new Date(now),
    moveBy: (seconds) => {
      now += seconds * 1000;
    },
  };
}
