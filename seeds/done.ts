import type { Outcome } from '../server/errors/server-issue';

/** What a service gave; a refusal means that the demonstration itself is wrong. */
export function done<Value>(outcome: Outcome<Value>): Value {
  if (outcome.ok) return outcome.value;
  throw new Error(`The demonstration was refused: ${JSON.stringify(outcome.issue)}`);
}
