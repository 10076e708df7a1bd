import { inject, Injectable, Injector } from '@angular/core';
import { defer, finalize, from, map, type Observable, shareReplay } from 'rxjs';

/** Asks for the password in place when a session has ended, once for all that wait. */
@Injectable({ providedIn: 'root' })
export class SignInAgain {
  private readonly injector = inject(Injector);
  private asking: Observable<boolean> | null = null;

  /** Emits when the person is back; fails with `failure` when they would not sign in. */
  ask(failure: unknown): Observable<true> {
    this.asking ??= this.open();
    return this.asking.pipe(
      map((back) => {
        if (!back) throw failure;
        return true;
      }),
    );
  }

  private open(): Observable<boolean> {
    return defer(() => from(this.load())).pipe(
      finalize(() => {
        this.asking = null;
      }),
      shareReplay(1),
    );
  }

  private async load(): Promise<boolean> {
    const { askForPassword } = await import('./sign-in-again-dialog');
    return askForPassword(this.injector);
  }
}
