import {
  type AnalysisIssue,
  type AnalysisResult,
  type AnalysisSpecification,
  computeAnalysis,
  type ResultFrame,
} from '#shared/analysis';
import type { Result } from '#shared/core';
import type { Estimate, EstimationIssue } from '#shared/stats';
import type { Tally } from '#shared/tally';
import { answerTo, type MethodQuestion } from '../methods/method-question';

/** A whole analysis to compute. */
export interface AnalysisTask {
  readonly kind: 'analysis';
  readonly specification: AnalysisSpecification;
  readonly frame: ResultFrame;
  readonly tally: Tally;
}

/** Work that takes its time: a whole analysis, or one method for one table. */
export type ComputingTask =
  AnalysisTask | { readonly kind: 'method'; readonly question: MethodQuestion };

/** What a task gives, by its kind. */
export interface ComputingAnswers {
  readonly analysis: Result<AnalysisResult, AnalysisIssue>;
  readonly method: Result<Estimate, EstimationIssue>;
}

/** Does a task; in the browser only off the main thread. */
export function perform(task: ComputingTask): ComputingAnswers[ComputingTask['kind']] {
  switch (task.kind) {
    case 'analysis':
      return computeAnalysis(task.specification, task.frame, task.tally);
    case 'method':
      return answerTo(task.question);
  }
}
