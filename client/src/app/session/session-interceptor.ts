import {
  type HttpHandlerFn,
  type HttpInterceptorFn,
  type HttpRequest,
  HttpXsrfTokenExtractor,
} from '@angular/common/http';
import { inject, Injector } from '@angular/core';
import { catchError, mergeMap, type Observable, throwError } from 'rxjs';
import { ApiProblem } from '../server-api/api-problem';
import { SessionStore } from './session-store';
import { SignInAgain } from './sign-in-again';

const TOKEN_HEADER = 'X-XSRF-TOKEN';

/**
 * Repeats a request that was refused only because the session had ended, or because another tab
 * had renewed its token. The page stays, and with it everything that was typed.
 */
export const sessionInterceptor: HttpInterceptorFn = (request, next) => {
  const injector = inject(Injector);
  return next(request).pipe(
    catchError((failure: unknown) =>
      recovered(failure, injector).pipe(mergeMap(() => next(withPresentToken(request, injector)))),
    ),
  );
};

/** Emits once the request may be repeated; fails with what it failed with when it may not. */
function recovered(failure: unknown, injector: Injector): Observable<unknown> {
  const code = failure instanceof ApiProblem ? failure.code : '';
  if (code === 'signInNeeded') return injector.get(SignInAgain).ask(failure);
  if (code === 'forgedRequest') return injector.get(SessionStore).refresh();
  return throwError(() => failure);
}

/** The header was set before this interceptor saw the request. */
function withPresentToken(
  request: HttpRequest<unknown>,
  injector: Injector,
): Parameters<HttpHandlerFn>[0] {
  const token = injector.get(HttpXsrfTokenExtractor).getToken();
  return token === null || !request.headers.has(TOKEN_HEADER)
    ? request
    : request.clone({ setHeaders: { [TOKEN_HEADER]: token } });
}
