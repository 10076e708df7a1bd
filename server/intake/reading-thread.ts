import type { Worker } from 'node:worker_threads';
import type { Result } from '#shared/core';
import { startWorker } from '../workers/launch';
import type { Chunk } from './encode/chunk';
import type { IntakeIssue } from './intake-issue';
import type { WorkerMessage, WorkerOrder } from './messages';
import type { ReadFile, ReadingOrder } from './read-file';
import type { Progress } from './reading';

/** How a reading ended: read or refused, stopped from outside, or broken by a bug. */
export type ThreadEnd =
  | { readonly kind: 'read'; readonly outcome: Result<ReadFile, IntakeIssue> }
  | { readonly kind: 'stopped' }
  | { readonly kind: 'broken'; readonly reason: unknown };

/** Where the pieces of a file and its progress go. */
export interface ReadingListener {
  /** Stores some pieces, of at most 768 KiB together; a failure ends the reading. */
  readonly storeChunks: (chunks: readonly Chunk[]) => Promise<void>;
  readonly onProgress: (progress: Progress) => void;
}

/** A thread that reads one file at a time. After an end that is not `read` it is of no more use. */
export interface ReadingThread {
  /** Resolves when every piece is stored. */
  readonly read: (order: ReadingOrder, listener: ReadingListener) => Promise<ThreadEnd>;
  /** Ends the thread; what it was reading is stopped. */
  readonly end: () => Promise<void>;
}

/** Which worker, and how much memory it may take. */
export interface ThreadOptions {
  readonly workerPath: string;
  readonly memoryInMebibytes: number;
}

/** Starts a thread. While it reads it keeps the process up, idle it does not. */
export function startReadingThread({
  workerPath,
  memoryInMebibytes,
}: ThreadOptions): ReadingThread {
  const worker = startWorker(workerPath, undefined, {
    resourceLimits: { maxOldGenerationSizeMb: memoryInMebibytes },
  });
  let stopped = false;
  return {
    read: async (order, listener) => {
      const end = await readOne(worker, order, listener);
      return end.kind === 'broken' && stopped ? { kind: 'stopped' } : end;
    },
    end: async () => {
      stopped = true;
      await worker.terminate();
    },
  };
}

function readOne(
  worker: Worker,
  file: ReadingOrder,
  { storeChunks, onProgress }: ReadingListener,
): Promise<ThreadEnd> {
  const order = (message: WorkerOrder): void => {
    worker.postMessage(message);
  };
  const storing = createStoring(storeChunks, (chunks) => {
    order({ kind: 'chunksStored', chunks });
  });
  return new Promise((resolve) => {
    const settle = (end: ThreadEnd): void => {
      worker.off('message', hear).off('error', fail).off('exit', ended).unref();
      void storing.idle().then((problem) => {
        resolve(problem === null ? end : { kind: 'broken', reason: problem });
      });
    };
    const hear = (message: WorkerMessage): void => {
      if (message.kind === 'progress') onProgress(message.progress);
      else if (message.kind === 'done') settle({ kind: 'read', outcome: message.outcome });
      else storing.add(message.chunk).catch(fail);
    };
    const fail = (reason: unknown): void => {
      settle({ kind: 'broken', reason });
    };
    const ended = (code: number): void => {
      fail(new Error(`The worker ended with code ${String(code)}.`));
    };
    worker.on('message', hear).on('error', fail).on('exit', ended).ref();
    order({ kind: 'read', order: file });
  });
}

interface Storing {
  /** Takes a piece; resolves when it is stored. */
  readonly add: (chunk: Chunk) => Promise<void>;
  /** Resolves when nothing is being stored any more, with what went wrong. */
  readonly idle: () => Promise<unknown>;
}

/** A transaction writes less than 1 MiB, so that others need not wait long. */
const BYTES_AT_ONCE = 786_432;
const CHUNKS_AT_ONCE = 500;

/**
 * Stores pieces one after the other, those that came meanwhile together; after a failure none any
 * more.
 */
function createStoring(
  storeChunks: ReadingListener['storeChunks'],
  stored: (chunks: number) => void,
): Storing {
  let waiting: readonly Chunk[] = [];
  let last: Promise<void> = Promise.resolve();
  const storeSome = async (): Promise<void> => {
    const some = firstOf(waiting);
    if (some.length === 0) return;
    waiting = waiting.slice(some.length);
    await storeChunks(some);
    stored(some.length);
  };
  return {
    add: (chunk) => {
      waiting = [...waiting, chunk];
      last = last.then(storeSome);
      return last;
    },
    idle: () =>
      last.then(
        () => null,
        (problem: unknown) => problem,
      ),
  };
}

/** The first pieces that are not too many together, at least one of them. */
function firstOf(chunks: readonly Chunk[]): readonly Chunk[] {
  let bytes = 0;
  const end = chunks.findIndex((chunk, at) => {
    bytes += chunk.bytes.length;
    return at === CHUNKS_AT_ONCE || (at > 0 && bytes > BYTES_AT_ONCE);
  });
  return end < 0 ? chunks : chunks.slice(0, end);
}
