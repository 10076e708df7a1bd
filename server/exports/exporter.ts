import type { Worker } from 'node:worker_threads';
import type { ErrorLog } from '../errors/error-handler';
import { refuse, type Outcome } from '../errors/server-issue';
import { startWorker } from '../workers/launch';
import type { ExportFormatId } from './export-format';
import type { ExportRequest } from './export-request';

/** A file to make. */
export interface ExportJob {
  readonly formatId: ExportFormatId;
  readonly request: ExportRequest;
}

/** What the worker sends back. */
export type WorkerAnswer =
  | { readonly ok: true; readonly bytes: Uint8Array<ArrayBuffer> }
  | { readonly ok: false; readonly reason: string };

/** Makes files away from the thread that answers requests, one at a time. */
export interface Exporter {
  /** The bytes of a file, or `exportsBusy`, `exportTooSlow`, `exportFailed`. */
  readonly make: (job: ExportJob) => Promise<Outcome<Uint8Array>>;
  /** Ends the worker; what it was making fails. */
  readonly close: () => Promise<void>;
}

/** How long a file may take, how many may wait, and when an idle worker ends. */
export interface ExportLimits {
  readonly secondsForOne: number;
  readonly mostWaiting: number;
  readonly idleSeconds: number;
  /** Which worker; tests name a slow or a broken one. */
  readonly workerPath: string;
}

/** Limits of a server. */
export const EXPORT_LIMITS: ExportLimits = {
  secondsForOne: 60,
  mostWaiting: 20,
  idleSeconds: 120,
  workerPath: 'exports/export-worker',
};

/** An exporter whose worker starts with the first file; a worker that failed is replaced. */
export function createExporter(log: ErrorLog, limits: ExportLimits = EXPORT_LIMITS): Exporter {
  const bench = createBench(limits);
  let waiting = 0;
  let turn: Promise<unknown> = Promise.resolve();
  const makeNow = async (job: ExportJob): Promise<Outcome<Uint8Array>> => {
    const answer = await bench.answerTo(job);
    if (answer.kind === 'made') return { ok: true, value: answer.bytes };
    log(`Making a ${job.formatId} file failed`, answer.reason);
    return answer.kind === 'slow'
      ? refuse('exportTooSlow', { facts: { seconds: limits.secondsForOne } })
      : refuse('exportFailed');
  };
  return {
    make: (job) => {
      if (waiting >= limits.mostWaiting) return Promise.resolve(refuse('exportsBusy'));
      waiting += 1;
      const made = turn.then(() => makeNow(job));
      turn = made.finally(() => (waiting -= 1)).catch(() => undefined);
      return made;
    },
    close: bench.clear,
  };
}

type Answer =
  | { readonly kind: 'made'; readonly bytes: Uint8Array }
  | { readonly kind: 'slow' | 'broken'; readonly reason: string };

/** Where the one worker stands. */
interface Bench {
  readonly answerTo: (job: ExportJob) => Promise<Answer>;
  readonly clear: () => Promise<void>;
}

function createBench({ workerPath, secondsForOne, idleSeconds }: ExportLimits): Bench {
  let worker: Worker | null = null;
  let idle: NodeJS.Timeout | undefined;
  const clear = async (): Promise<void> => {
    clearTimeout(idle);
    const ending = worker;
    worker = null;
    await ending?.terminate();
  };
  return {
    clear,
    answerTo: async (job) => {
      clearTimeout(idle);
      worker ??= startWorker(workerPath, undefined, MEMORY);
      // A worker at work keeps the process up, an idle one does not.
      worker.ref();
      const answer = await answerOf(worker, job, secondsForOne * 1000);
      worker.unref();
      if (answer.kind !== 'made') await clear();
      else idle = setTimeout(() => void clear(), idleSeconds * 1000).unref();
      return answer;
    },
  };
}

const MEMORY = { resourceLimits: { maxOldGenerationSizeMb: 512 } } as const;

function answerOf(worker: Worker, job: ExportJob, milliseconds: number): Promise<Answer> {
  return new Promise((resolve) => {
    const settle = (answer: Answer): void => {
      clearTimeout(timer);
      worker.off('message', answered).off('error', broken).off('exit', ended);
      resolve(answer);
    };
    const answered = (answer: WorkerAnswer): void => {
      if (answer.ok) settle({ kind: 'made', bytes: answer.bytes });
      else settle({ kind: 'broken', reason: answer.reason });
    };
    const broken = (problem: Error): void => {
      settle({ kind: 'broken', reason: problem.stack ?? problem.message });
    };
    const ended = (code: number): void => {
      settle({ kind: 'broken', reason: `The worker ended with code ${String(code)}.` });
    };
    const timer = setTimeout(() => {
      settle({ kind: 'slow', reason: `It took longer than ${String(milliseconds)} ms.` });
    }, milliseconds);
    worker.on('message', answered).on('error', broken).on('exit', ended);
    worker.postMessage(job);
  });
}
