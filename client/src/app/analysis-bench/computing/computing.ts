import { DestroyRef, inject, Injectable, InjectionToken } from '@angular/core';
import { Observable } from 'rxjs';
import type { NumberedAnswer } from './computing-worker';
import type { ComputingAnswers, ComputingTask } from './computing-task';

/** Starts the worker; another one in tests. */
export const COMPUTING_WORKER = new InjectionToken<() => Worker>('computing worker', {
  providedIn: 'root',
  factory: () => () =>
    new Worker(new URL('./computing-worker', import.meta.url), { type: 'module' }),
});

/** Computes what takes its time off the main thread, one task after the other. */
@Injectable()
export class Computing {
  private readonly start = inject(COMPUTING_WORKER);
  private worker: Worker | null = null;
  private tasks = 0;

  constructor() {
    inject(DestroyRef).onDestroy(() => {
      this.worker?.terminate();
    });
  }

  /** Gives the one answer, or the error of a worker that broke. */
  perform<Kind extends ComputingTask['kind']>(
    task: Extract<ComputingTask, { kind: Kind }>,
  ): Observable<ComputingAnswers[Kind]> {
    return new Observable((answers) => {
      const worker = (this.worker ??= this.start());
      const number = (this.tasks += 1);
      const onMessage = ({ data }: MessageEvent<NumberedAnswer>): void => {
        if (data.number !== number) return;
        answers.next(data.answer as ComputingAnswers[Kind]);
        answers.complete();
      };
      const onError = (problem: ErrorEvent): void => {
        this.worker = null;
        answers.error(problem);
      };
      worker.addEventListener('message', onMessage);
      worker.addEventListener('error', onError);
      worker.postMessage({ number, task });
      return () => {
        worker.removeEventListener('message', onMessage);
        worker.removeEventListener('error', onError);
      };
    });
  }
}
