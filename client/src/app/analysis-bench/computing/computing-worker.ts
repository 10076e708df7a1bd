import { type ComputingTask, perform } from './computing-task';

/** A task on its way to the worker, numbered so that its answer finds back. */
export interface NumberedTask {
  readonly number: number;
  readonly task: ComputingTask;
}

addEventListener('message', ({ data }: MessageEvent<NumberedTask>) => {
  postMessage({ number: data.number, answer: perform(data.task) });
});
