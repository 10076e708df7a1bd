import { parentPort } from 'node:worker_threads';

/** Takes jobs and never answers; the interval keeps it alive. */
parentPort?.on('message', () => undefined);
setInterval(() => undefined, 1000);
