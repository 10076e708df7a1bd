import { generateKeyBetween, generateNKeysBetween } from 'fractional-indexing';
import type { Block, Report } from './report';

/** The blocks of a report that are not removed, in print order: by order key, ties by id. */
export function visibleBlocks(report: Pick<Report, 'blocks'>): readonly Block[] {
  return report.blocks.filter((block) => block.removedAt === null).toSorted(compareBlocks);
}

/** Where a block goes: its order key, and new keys for neighbours that shared one key. */
export interface Placement {
  readonly orderKey: string;
  readonly rekeyed: readonly { readonly blockId: string; readonly orderKey: string }[];
}

/**
 * The order key that puts a block after `previousId` (null: at the top).
 *
 * Two people who insert at the same place at once get the same key; `rekeyed` then lists the
 * followers that must move a little so that there is room. It is empty otherwise. `moving` is the
 * block that is placed, when it is in the report already.
 */
export function placeAfter(
  report: Pick<Report, 'blocks'>,
  previousId: string | null,
  moving: string | null = null,
): Placement {
  const others = visibleBlocks(report).filter((block) => block.id !== moving);
  const index = others.findIndex((block) => block.id === previousId) + 1;
  const previousKey = others[index - 1]?.orderKey ?? null;
  const tied = followersWithKey(others.slice(index), previousKey);
  const nextKey = others[index + tied.length]?.orderKey ?? null;
  const [orderKey, ...keys] = generateNKeysBetween(previousKey, nextKey, tied.length + 1);
  return {
    orderKey: orderKey ?? generateKeyBetween(previousKey, nextKey),
    rekeyed: tied.map((block, at) => ({ blockId: block.id, orderKey: keys[at] ?? '' })),
  };
}

/** Whether a text is an order key that keys can be placed around. */
export function isOrderKey(key: string): boolean {
  if (!/^[0-9A-Za-z]{2,200}$/u.test(key)) return false;
  try {
    return generateKeyBetween(null, key) < key && generateKeyBetween(key, null) > key;
  } catch {
    // The library reports an unreadable key by throwing.
    return false;
  }
}

function followersWithKey(followers: readonly Block[], key: string | null): readonly Block[] {
  const firstOther = followers.findIndex((block) => block.orderKey !== key);
  return firstOther === -1 ? followers : followers.slice(0, firstOther);
}

/** By code units, as the key library and the database compare; never by the reader's language. */
function compareBlocks(one: Block, other: Block): number {
  if (one.orderKey !== other.orderKey) return one.orderKey < other.orderKey ? -1 : 1;
  return one.id < other.id ? -1 : 1;
}
