// Loads a worker written in TypeScript when the server runs from its sources.
import { workerData } from 'node:worker_threads';
import { register } from 'tsx/esm/api';

register();
await import(workerData.sourceOfWorker);
