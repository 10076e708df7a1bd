import { workerData } from 'node:worker_threads';

/** What the starter of this worker passed as `input`; undefined outside a worker. */
export function workerInput(): unknown {
  const given: unknown = workerData;
  return typeof given === 'object' && given !== null && 'input' in given ? given.input : undefined;
}
