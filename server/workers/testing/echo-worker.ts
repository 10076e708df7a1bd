import { parentPort } from 'node:worker_threads';
import { success } from '#shared/core';
import { workerInput } from '../worker-input';

parentPort?.postMessage(success(workerInput()));
