import { parentPort } from 'node:worker_threads';
import { computeAnalysis } from '#shared/analysis';
import { workerInput } from '../workers/worker-input';
import type { Computation } from './compute-off-thread';

/** Computes one analysis, answers, and ends. */
const { specification, frame, tally } = workerInput() as Computation;
parentPort?.postMessage(computeAnalysis(specification, frame, tally));
