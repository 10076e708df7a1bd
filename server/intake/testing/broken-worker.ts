import { parentPort } from 'node:worker_threads';

parentPort?.on('message', () => {
  throw new Error('This worker breaks.');
});
