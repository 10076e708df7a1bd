import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import type {
  FirstAdministratorRequest,
  PasswordChangeRequest,
  PasswordResetCompletion,
  PasswordResetRequest,
  SessionView,
  SignInRequest,
} from '#shared/api';
import type { Observable } from 'rxjs';

/** Signing in and out, and passwords. */
@Injectable({ providedIn: 'root' })
export class SessionApi {
  private readonly http = inject(HttpClient);

  /** Who is signed in. Also renews the token that unsafe requests must echo. */
  read(): Observable<SessionView> {
    return this.http.get<SessionView>('/api/session');
  }

  signIn(request: SignInRequest): Observable<SessionView> {
    return this.http.post<SessionView>('/api/session', request);
  }

  signOut(): Observable<void> {
    return this.http.delete<undefined>('/api/session');
  }

  createFirstAdministrator(request: FirstAdministratorRequest): Observable<SessionView> {
    return this.http.post<SessionView>('/api/first-administrator', request);
  }

  changePassword(request: PasswordChangeRequest): Observable<void> {
    return this.http.post<undefined>('/api/password-changes', request);
  }

  /** Succeeds whether or not the address has an account. */
  requestPasswordReset(request: PasswordResetRequest): Observable<void> {
    return this.http.post<undefined>('/api/password-resets', request);
  }

  completePasswordReset(request: PasswordResetCompletion): Observable<void> {
    return this.http.post<undefined>('/api/password-resets/completion', request);
  }
}
