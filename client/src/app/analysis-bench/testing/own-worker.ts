import type { NumberedTask } from '../computing/computing-worker';
import { perform } from '../computing/computing-task';

/** A worker of the page's own: it answers, or breaks, when the test says so. */
export class OwnWorker extends EventTarget {
  private readonly tasks: NumberedTask[] = [];

  postMessage(task: NumberedTask): void {
    this.tasks.push(task);
  }

  answer(): void {
    for (const { number, task } of this.tasks.splice(0)) {
      this.dispatchEvent(new MessageEvent('message', { data: { number, answer: perform(task) } }));
    }
  }

  break(): void {
    this.tasks.splice(0);
    this.dispatchEvent(new Event('error'));
  }

  terminate(): void {
    this.tasks.splice(0);
  }
}
