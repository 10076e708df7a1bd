import {
  type HttpHandlerFn,
  type HttpInterceptorFn,
  type HttpRequest,
  HttpXsrfTokenExtractor,
} from '@angular/common/http';
import { inject, Injector } from '@angular/core';
import { catchError, mergeMap, type Observable, of, throwError } from 'rxjs';
import { ApiProblem } from '../server-api/api-problem';
import { SessionApi } from '../server-api/session-api';
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
  if (code === 'forgedRequest') return tokenRenewed(failure, injector);
  return throwError(() => failure);
}

/** Reading the session renews the token; it also tells whether the session is still there. */
function tokenRenewed(failure: unknown, injector: Injector): Observable<unknown> {
  const wasSignedIn = injector.get(SessionStore).person() !== null;
  return injector
    .get(SessionApi)
    .read()
    .pipe(
      mergeMap(({ person }) =>
        wasSignedIn && person === null ? injector.get(SignInAgain).ask(failure) : of(person),
      ),
    );
}

/** The header was set, or left out, before this interceptor saw the request. */
function withPresentToken(
  request: HttpRequest<unknown>,
  injector: Injector,
): Parameters<HttpHandlerFn>[0] {
  const token = injector.get(HttpXsrfTokenExtractor).getToken();
  const needsNone = token === null || ['GET', 'HEAD'].includes(request.method);
  return needsNone ? request : request.clone({ setHeaders: { [TOKEN_HEADER]: token } });
}
