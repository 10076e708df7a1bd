import { inject, Injectable, signal } from '@angular/core';
import type { ReportView, StepsView } from '#shared/api';
import {
  defer,
  type MonoTypeOperatorFunction,
  type Observable,
  retry,
  tap,
  throwError,
  timeout,
} from 'rxjs';
import { ApiProblem } from '../../server-api/api-problem';
import { ReportsApi } from '../../server-api/reports-api';
import { type MadeStep, submissionOf } from './made-step';
import { type ReportPlace, ReportState } from './report-state';
import { retryDelay } from './retry-delay';

const PATIENCE_MILLISECONDS = 15_000;

/** Talks to the server about the open report, again and again where that may help. */
@Injectable()
export class StepTransport {
  private readonly api = inject(ReportsApi);
  private readonly state = inject(ReportState);

  /** Why the last attempt to send failed, while it goes on trying; null while all is well. */
  readonly trouble = signal<ApiProblem | null>(null);

  /** Sends steps as `steps` gives them at each attempt; fails only with what will not pass. */
  submit(steps: () => readonly MadeStep[]): Observable<StepsView> {
    const { studyId, reportId } = this.place();
    return defer(() =>
      this.api.submitSteps(studyId, reportId, { steps: steps().map(submissionOf) }),
    ).pipe(
      withinPatience(),
      retry({ delay: (failure, attempt) => this.waitAfter(failure, attempt) }),
      tap({
        next: () => {
          this.trouble.set(null);
        },
        error: () => {
          this.trouble.set(null);
        },
      }),
    );
  }

  stepsAfter(seq: number): Observable<StepsView> {
    const { studyId, reportId } = this.place();
    return this.api.stepsAfter(studyId, reportId, seq).pipe(withinPatience());
  }

  read(): Observable<ReportView> {
    const { studyId, reportId } = this.place();
    return this.api.read(studyId, reportId).pipe(withinPatience());
  }

  private waitAfter(failure: unknown, attempt: number): Observable<unknown> {
    this.trouble.set(ApiProblem.from(failure));
    return retryDelay(failure, attempt);
  }

  private place(): ReportPlace {
    const place = this.state.place();
    if (place === null) throw new Error('No report is open.');
    return place;
  }
}

/**
 * A server that takes a request and never answers must not hold up all that follows. Asking again
 * does no harm: the server knows steps by their ids.
 */
function withinPatience<Answer>(): MonoTypeOperatorFunction<Answer> {
  const noAnswer = { code: 'noAnswer', title: 'The server does not answer.' };
  return timeout({
    each: PATIENCE_MILLISECONDS,
    with: () => throwError(() => new ApiProblem(noAnswer)),
  });
}
