import { computed, inject, Injectable, signal } from '@angular/core';
import type { FirstAdministratorRequest, SessionView, SignInRequest } from '#shared/api';
import { map, type Observable, of, tap } from 'rxjs';
import { SessionApi } from '../server-api/session-api';

/** Who is signed in, and what this service needs before anybody is. */
@Injectable({ providedIn: 'root' })
export class SessionStore {
  private readonly api = inject(SessionApi);
  private readonly known = signal<SessionView | null>(null);

  readonly view = this.known.asReadonly();
  readonly person = computed(() => this.known()?.person ?? null);
  readonly administrator = computed(() => this.person()?.administrator ?? false);

  /** The session, asked from the server only once. */
  ready(): Observable<SessionView> {
    const known = this.known();
    return known === null ? this.refresh() : of(known);
  }

  refresh(): Observable<SessionView> {
    return this.remember(this.api.read());
  }

  signIn(request: SignInRequest): Observable<SessionView> {
    return this.remember(this.api.signIn(request));
  }

  createFirstAdministrator(request: FirstAdministratorRequest): Observable<SessionView> {
    return this.remember(this.api.createFirstAdministrator(request));
  }

  /** Ends the session; the next question about it goes to the server. */
  signOut(): Observable<void> {
    return this.api.signOut().pipe(
      tap(() => {
        this.known.set(null);
      }),
      map(() => undefined),
    );
  }

  private remember(answer: Observable<SessionView>): Observable<SessionView> {
    return answer.pipe(
      tap((view) => {
        this.known.set(view);
      }),
    );
  }
}
