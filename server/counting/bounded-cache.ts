/** Keeps what was used last, as long as it fits. */
export interface BoundedCache<Value> {
  /** The value of a key; loads it when it is not kept, once for everybody who asks meanwhile. */
  readonly get: (key: string, load: () => Promise<Value>) => Promise<Value>;
  /** The bytes that are kept at the moment. */
  readonly keptBytes: () => number;
}

/**
 * A cache bounded in bytes: what was used longest ago goes first.
 *
 * A value larger than the bound is given but not kept; a load that fails is tried again next time.
 */
export function createBoundedCache<Value>(
  bytesAtMost: number,
  bytesOf: (value: Value) => number,
): BoundedCache<Value> {
  const shelf = createShelf(bytesAtMost, bytesOf);
  const loading = new Map<string, Promise<Value>>();

  async function loadOnce(key: string, load: () => Promise<Value>): Promise<Value> {
    try {
      const value = await load();
      shelf.keep(key, value);
      return value;
    } finally {
      loading.delete(key);
    }
  }

  return {
    keptBytes: shelf.bytes,
    get: async (key, load) => {
      const present = shelf.use(key);
      if (present !== undefined) return present;
      const pending = loading.get(key) ?? loadOnce(key, load);
      loading.set(key, pending);
      return pending;
    },
  };
}

interface Shelf<Value> {
  readonly keep: (key: string, value: Value) => void;
  readonly use: (key: string) => Value | undefined;
  readonly bytes: () => number;
}

/** A map keeps its keys in the order in which they were set: the first was used longest ago. */
function createShelf<Value>(bytesAtMost: number, bytesOf: (value: Value) => number): Shelf<Value> {
  const kept = new Map<string, { readonly value: Value; readonly bytes: number }>();
  let total = 0;
  return {
    bytes: () => total,
    keep: (key, value) => {
      const bytes = bytesOf(value);
      if (bytes > bytesAtMost) return;
      kept.set(key, { value, bytes });
      total += bytes;
      for (const [oldest, entry] of kept) {
        if (total <= bytesAtMost) return;
        kept.delete(oldest);
        total -= entry.bytes;
      }
    },
    use: (key) => {
      const entry = kept.get(key);
      if (entry === undefined) return undefined;
      kept.delete(key);
      kept.set(key, entry);
      return entry.value;
    },
  };
}
