import type { ErrorLog } from '../errors/error-handler';

/** Work that a request begins and does not wait for. */
export interface Background {
  /** Begins the work; what it throws is written to the log under this name. */
  readonly run: (name: string, work: () => Promise<void>) => void;
  /** Resolves when nothing runs any more. */
  readonly idle: () => Promise<void>;
}

/** Keeps track of work in the background, so that stopping can wait for it. */
export function createBackground(log: ErrorLog): Background {
  const running = new Set<Promise<void>>();
  return {
    run: (name, work) => {
      const task = work().catch((problem: unknown) => {
        log(`${name} failed`, problem);
      });
      running.add(task);
      void task.finally(() => running.delete(task));
    },
    idle: async () => {
      while (running.size > 0) await Promise.all(running);
    },
  };
}
