import { fromEvent, merge, type Observable, Subject, take, throwError, timer } from 'rxjs';
import { ApiProblem } from '../../server-api/api-problem';

const LONGEST_WAIT_MILLISECONDS = 30_000;
const FIRST_WAIT_MILLISECONDS = 1_000;

/** Asks every waiting request to try again at once. */
export const tryAgainNow = new Subject<void>();

/** Whether trying again may help: the server was out of reach, busy, or the session had ended. */
export function isPassing(problem: ApiProblem): boolean {
  return problem.status === 0 || problem.status >= 500 || PASSING.includes(problem.status);
}

/** When to try again: after a growing wait, or once the network is back; never for a refusal. */
export function retryDelay(failure: unknown, attempt: number): Observable<unknown> {
  if (!isPassing(ApiProblem.from(failure))) return throwError(() => failure);
  const wait = Math.min(LONGEST_WAIT_MILLISECONDS, FIRST_WAIT_MILLISECONDS * 2 ** (attempt - 1));
  return merge(timer(wait), fromEvent(window, 'online'), tryAgainNow).pipe(take(1));
}

/** Session ended, request too slow, too many requests. */
const PASSING = [401, 408, 429];
