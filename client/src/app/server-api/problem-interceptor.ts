import { HttpErrorResponse, type HttpInterceptorFn } from '@angular/common/http';
import { catchError, from, mergeMap, type Observable, of, throwError } from 'rxjs';
import { ApiProblem } from './api-problem';

/** Lets every request fail with an `ApiProblem`. */
export const problemInterceptor: HttpInterceptorFn = (request, next) =>
  next(request).pipe(
    catchError((failure: unknown) =>
      withReadableBody(failure).pipe(
        mergeMap((readable) => throwError(() => ApiProblem.from(readable))),
      ),
    ),
  );

/** A refused download brings its problem details as a file. */
function withReadableBody(failure: unknown): Observable<unknown> {
  if (!(failure instanceof HttpErrorResponse) || !(failure.error instanceof Blob)) {
    return of(failure);
  }
  return from(failure.error.text().then((error) => withBody(failure, error)));
}

function withBody(failure: HttpErrorResponse, error: string): HttpErrorResponse {
  return new HttpErrorResponse({ error, status: failure.status });
}
