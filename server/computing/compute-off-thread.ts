import {
  computeAnalysis,
  takesTime,
  type AnalysisIssue,
  type AnalysisResult,
  type AnalysisSpecification,
  type ResultFrame,
} from '#shared/analysis';
import type { Result } from '#shared/core';
import type { Tally } from '#shared/tally';
import { startWorker } from '../workers/launch';

/** An analysis with its counts. */
export interface Computation {
  readonly specification: AnalysisSpecification;
  readonly frame: ResultFrame;
  readonly tally: Tally;
}

/**
 * Computes an analysis: at once when its methods are light, and in a thread of its own when some
 * take their time, so that other requests are answered meanwhile. A thread that breaks is an error.
 */
export function compute(computation: Computation): Promise<Result<AnalysisResult, AnalysisIssue>> {
  const { specification, frame, tally } = computation;
  return takesTime(specification)
    ? computeInThread(computation)
    : Promise.resolve(computeAnalysis(specification, frame, tally));
}

function computeInThread(computation: Computation): Promise<Result<AnalysisResult, AnalysisIssue>> {
  const worker = startWorker('computing/compute-worker', computation);
  return new Promise((resolve, reject) => {
    worker.once('message', resolve);
    worker.once('error', reject);
    worker.once('exit', (code) => {
      reject(new Error(`The computing thread ended with code ${String(code)} and no result.`));
    });
  });
}
