/** The present moment; passed in, so that tests can move it. */
export interface Clock {
  readonly now: () => Date;
}

/** The clock of the machine. */
export const systemClock: Clock = { now: () => new Date() };

/** The present moment as it is stored: ISO 8601, UTC. */
export function timestamp(clock: Clock): string {
  return clock.now().toISOString();
}
