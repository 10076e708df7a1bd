import { createHmac } from 'node:crypto';
import type { Dependencies } from '../../dependencies';
import type { TrailEntry } from '../../models/trail/trail-store';
import type { Unit } from '../../models/unit-of-work';
import { timestamp } from '../../runtime/clock';

/** A change to be recorded. `chain` is a study's id, or `site` for accounts and settings. */
export interface RecordedChange {
  readonly chain: string;
  readonly personId: string | null;
  /** Dotted name of what happened, as in `study.changed` or `member.roleChanged`. */
  readonly what: string;
  readonly before: unknown;
  readonly after: unknown;
}

/**
 * Appends a change to its chain, in the transaction of the change itself.
 *
 * Each entry is sealed (HMAC-SHA256) together with the seal before it, so that an altered or
 * removed entry shows. `before` and `after` are kept as JSON; null or undefined stands for nothing.
 */
export async function appendToTrail(
  { database, clock, secrets }: Dependencies,
  change: RecordedChange,
  unit: Unit,
): Promise<void> {
  const head = await database.stores.trail.head(change.chain, unit);
  const entry = {
    chain: change.chain,
    number: (head?.number ?? 0) + 1,
    at: timestamp(clock),
    personId: change.personId,
    what: change.what,
    before: jsonOrNull(change.before),
    after: jsonOrNull(change.after),
    previousMac: head?.mac ?? '',
  };
  await database.stores.trail.append({ ...entry, mac: sealOf(entry, secrets.trail) }, unit);
}

/** The seal of an entry: a keyed hash over everything that it says, in a fixed order. */
export function sealOf(entry: Omit<TrailEntry, 'mac'>, key: Buffer): string {
  const { chain, number, at, personId, what, before, after, previousMac } = entry;
  const sealed = JSON.stringify([chain, number, at, personId, what, before, after, previousMac]);
  return createHmac('sha256', key).update(sealed).digest('hex');
}

function jsonOrNull(value: unknown): string | null {
  return value === null || value === undefined ? null : JSON.stringify(value);
}
