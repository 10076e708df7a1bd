import { type ComputingAnswers, type ComputingTask, perform } from './computing-task';

/** A task on its way to the worker, numbered so that its answer finds back. */
export interface NumberedTask {
  readonly number: number;
  readonly task: ComputingTask;
}

/** What a numbered task gave. */
export interface NumberedAnswer {
  readonly number: number;
  readonly answer: ComputingAnswers[ComputingTask['kind']];
}

addEventListener('message', ({ data }: MessageEvent<NumberedTask>) => {
  const answer: NumberedAnswer = { number: data.number, answer: perform(data.task) };
  postMessage(answer);
});
