import type { Worker } from 'node:worker_threads';
import type { Result } from '#shared/core';
import type { ErrorLog } from '../errors/error-handler';
import { startWorker } from '../workers/launch';
import type { Chunk } from './encode/chunk';
import type { IntakeIssue } from './intake-issue';
import { CHUNK_STORED, type WorkerMessage } from './messages';
import type { ReadFile, ReadingOrder } from './read-file';
import type { Progress } from './reading';

/** How a reading ended; null when it was stopped. */
export type ReadingEnd = Result<ReadFile, IntakeIssue> | null;

/** A file to read, and where its pieces go. */
export interface IntakeJob {
  readonly id: string;
  readonly order: ReadingOrder;
  /** Stores a piece; a failure ends the reading. */
  readonly storeChunk: (chunk: Chunk) => Promise<void>;
}

/** Reads files in threads of their own, a few at a time. */
export interface Intake {
  /** Reads a file; resolves when every piece is stored, with what was read or why not. */
  readonly read: (job: IntakeJob) => Promise<ReadingEnd>;
  /** How far a reading is; null when there is none of this id. */
  readonly progressOf: (id: string) => Progress | null;
  /** Ends a reading; resolves when nothing of it goes on. */
  readonly stop: (id: string) => Promise<void>;
  /** Ends all readings. */
  readonly close: () => Promise<void>;
}

/** Limits of the threads that read files. */
export interface IntakeLimits {
  readonly atATime: number;
  readonly memoryInMebibytes: number;
  /** Which worker; tests name a broken one. */
  readonly workerPath: string;
}

export const INTAKE_LIMITS: IntakeLimits = {
  atATime: 2,
  memoryInMebibytes: 1024,
  workerPath: 'intake/intake-worker',
};

/** Makes an intake; its threads start when files come and end with them. */
export function createIntake(log: ErrorLog, limits: IntakeLimits = INTAKE_LIMITS): Intake {
  const readings = new Map<string, Reading>();
  const turns = createTurns(limits.atATime);

  const read = async (job: IntakeJob): Promise<ReadingEnd> => {
    const state: ReadingState = { progress: { share: 0, rows: 0 }, stopped: false, worker: null };
    const ended = turns.take(() => (state.stopped ? null : runWorker(job, state, limits, log)));
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
    await reading.state.worker?.terminate();
    await reading.ended;
  };

  return {
    read,
    stop,
    progressOf: (id) => readings.get(id)?.state.progress ?? null,
    close: async () => {
      await Promise.all([...readings.keys()].map(stop));
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
  worker: Worker | null;
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

function runWorker(
  { order, storeChunk }: IntakeJob,
  reading: ReadingState,
  { workerPath, memoryInMebibytes }: IntakeLimits,
  log: ErrorLog,
): Promise<ReadingEnd> {
  const resourceLimits = { maxOldGenerationSizeMb: memoryInMebibytes };
  const worker = startWorker(workerPath, order, { resourceLimits });
  reading.worker = worker;
  const storing = createStoring(storeChunk, () => {
    worker.postMessage(CHUNK_STORED);
  });
  return new Promise((resolve) => {
    let end: ReadingEnd = null;
    const fail = (problem: unknown): void => {
      if (!reading.stopped) log('Reading a file failed', problem);
      end = FAILED;
      void worker.terminate();
    };
    worker.on('message', (message: WorkerMessage) => {
      if (message.kind === 'progress') reading.progress = message.progress;
      else if (message.kind === 'done') end = message.outcome;
      else storing.add(message.chunk).catch(fail);
    });
    worker.once('error', fail);
    worker.once('exit', () => {
      void storing.idle().then(() => {
        resolve(reading.stopped ? null : (end ?? FAILED));
      });
    });
  });
}

const FAILED: ReadingEnd = { ok: false, issue: { code: 'readerFailed' } };

interface Storing {
  readonly add: (chunk: Chunk) => Promise<void>;
  /** Resolves when nothing is being stored any more, failed or not. */
  readonly idle: () => Promise<void>;
}

/** Stores pieces one after the other; after a failure none any more. */
function createStoring(storeChunk: IntakeJob['storeChunk'], stored: () => void): Storing {
  let last: Promise<void> = Promise.resolve();
  return {
    add: (chunk) => {
      last = last.then(() => storeChunk(chunk)).then(stored);
      return last;
    },
    idle: () => last.catch(() => undefined),
  };
}
