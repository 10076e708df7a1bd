import type { Result } from '#shared/core';
import type { ErrorLog } from '../errors/error-handler';
import type { IntakeIssue } from './intake-issue';
import type { ReadFile, ReadingOrder } from './read-file';
import type { Progress } from './reading';
import {
  startReadingThread,
  type ReadingListener,
  type ReadingThread,
  type ThreadOptions,
} from './reading-thread';

/** How a reading ended; null when it was stopped. */
export type ReadingEnd = Result<ReadFile, IntakeIssue> | null;

/** A file to read, and where its pieces go. */
export interface IntakeJob {
  readonly id: string;
  readonly order: ReadingOrder;
  readonly storeChunks: ReadingListener['storeChunks'];
}

/** Reads files in threads of their own, a few at a time. */
export interface Intake {
  /** Reads a file; resolves when every piece is stored, with what was read or why not. */
  readonly read: (job: IntakeJob) => Promise<ReadingEnd>;
  /** How far a reading is; null when there is none of this id. */
  readonly progressOf: (id: string) => Progress | null;
  /** Ends a reading; resolves when nothing of it goes on. */
  readonly stop: (id: string) => Promise<void>;
  /** Ends all readings and all threads. */
  readonly close: () => Promise<void>;
}

/** Limits of the threads that read files. */
export interface IntakeLimits extends ThreadOptions {
  readonly atATime: number;
  /** How long a thread waits for the next file. */
  readonly idleSeconds: number;
}

/** Limits of a server. */
export const INTAKE_LIMITS: IntakeLimits = {
  atATime: 2,
  idleSeconds: 60,
  memoryInMebibytes: 1024,
  workerPath: 'intake/intake-worker',
};

/** Makes an intake; threads start when files come and end some time after the last one. */
export function createIntake(log: ErrorLog, limits: IntakeLimits = INTAKE_LIMITS): Intake {
  const readings = new Map<string, Reading>();
  const turns = createTurns(limits.atATime);
  const threads = createThreads(limits);

  const read = async (job: IntakeJob): Promise<ReadingEnd> => {
    const state: ReadingState = { progress: { share: 0, rows: 0 }, stopped: false, thread: null };
    const ended = turns.take(() => (state.stopped ? null : readNow(job, state, threads, log)));
    const reading = { state, ended };
    readings.set(job.id, reading);
    try {
      return await ended;
    } finally {
      if (readings.get(job.id) === reading) readings.delete(job.id);
    }
  };

  const stop = async (id: string): Promise<void> => {
    const reading = readings.get(id);
    if (reading === undefined) return;
    reading.state.stopped = true;
    await reading.state.thread?.end();
    await reading.ended;
  };

  return {
    read,
    stop,
    progressOf: (id) => readings.get(id)?.state.progress ?? null,
    close: async () => {
      await Promise.all([...readings.keys()].map(stop));
      await threads.close();
    },
  };
}

interface Reading {
  readonly state: ReadingState;
  readonly ended: Promise<ReadingEnd>;
}

interface ReadingState {
  progress: Progress;
  stopped: boolean;
  thread: ReadingThread | null;
}

async function readNow(
  { order, storeChunks }: IntakeJob,
  state: ReadingState,
  threads: Threads,
  log: ErrorLog,
): Promise<ReadingEnd> {
  const thread = threads.take();
  state.thread = thread;
  const onProgress = (progress: Progress): void => {
    state.progress = progress;
  };
  const end = await thread.read(order, { storeChunks, onProgress });
  if (end.kind === 'read') {
    threads.giveBack(thread);
    return end.outcome;
  }
  await thread.end();
  if (state.stopped || end.kind === 'stopped') return null;
  log('Reading a file failed', end.reason);
  return { ok: false, issue: { code: 'readerFailed' } };
}

interface Threads {
  readonly take: () => ReadingThread;
  readonly giveBack: (thread: ReadingThread) => void;
  readonly close: () => Promise<void>;
}

/** Threads that wait for the next file; one that waits too long ends. */
function createThreads(limits: IntakeLimits): Threads {
  const waiting = new Map<ReadingThread, NodeJS.Timeout>();
  const end = async (thread: ReadingThread): Promise<void> => {
    clearTimeout(waiting.get(thread));
    waiting.delete(thread);
    await thread.end();
  };
  return {
    take: () => {
      const [first] = waiting.keys();
      if (first === undefined) return startReadingThread(limits);
      clearTimeout(waiting.get(first));
      waiting.delete(first);
      return first;
    },
    giveBack: (thread) => {
      const timer = setTimeout(() => void end(thread), limits.idleSeconds * 1000).unref();
      waiting.set(thread, timer);
    },
    close: async () => {
      await Promise.all([...waiting.keys()].map(end));
    },
  };
}

interface Turns {
  readonly take: <Value>(work: () => Promise<Value> | Value) => Promise<Value>;
}

/** Lets so many at a time work; the others wait in line. */
function createTurns(atATime: number): Turns {
  let free = atATime;
  const waiting: (() => void)[] = [];
  return {
    take: async (work) => {
      if (free === 0) await new Promise<void>((resolve) => waiting.push(resolve));
      else free -= 1;
      try {
        return await work();
      } finally {
        const next = waiting.shift();
        if (next === undefined) free += 1;
        else next();
      }
    },
  };
}
