import type { Dependencies } from '../../dependencies';
import type { TrailEntry } from '../../models/trail/trail-store';
import { sealOf } from './append-to-trail';

/** Whether a chain is whole; if not, the number of the first entry that does not hold. */
export type TrailCheck =
  | { readonly whole: true; readonly entries: number; readonly head: string }
  | { readonly whole: false; readonly firstBroken: number };

/** Recomputes every seal of a chain. A cut-off tail shows by the head, which is compared apart. */
export async function verifyTrail(
  { database, secrets }: Dependencies,
  chain: string,
): Promise<TrailCheck> {
  const entries = await database.stores.trail.list(chain);
  const broken = entries.findIndex(
    (entry, index) => !holds(entry, entries[index - 1], secrets.trail),
  );
  if (broken >= 0) return { whole: false, firstBroken: broken + 1 };
  return { whole: true, entries: entries.length, head: entries.at(-1)?.mac ?? '' };
}

function holds(entry: TrailEntry, before: TrailEntry | undefined, key: Buffer): boolean {
  return (
    entry.number === (before?.number ?? 0) + 1 &&
    entry.previousMac === (before?.mac ?? '') &&
    entry.mac === sealOf(entry, key)
  );
}
