/** Runs writes one after the other, in the order in which they came. */
export interface WriteQueue {
  readonly run: <Value>(write: () => Promise<Value>) => Promise<Value>;
  /** Resolves when everything that was queued so far has ended. */
  readonly idle: () => Promise<void>;
}

/**
 * SQLite has one writer at a time, and concurrent write transactions fail each other; every write
 * of the process goes through one queue instead. A write that fails does not stop the next one.
 */
export function createWriteQueue(): WriteQueue {
  let last: Promise<unknown> = Promise.resolve();
  return {
    run: (write) => {
      const mine = last.then(write);
      last = mine.catch(() => undefined);
      return mine;
    },
    idle: async () => {
      await last;
    },
  };
}
