import { inject } from '@angular/core';
import { type CanActivateFn, Router, type UrlTree } from '@angular/router';
import type { SessionView } from '#shared/api';
import { map } from 'rxjs';
import { SessionStore } from './session-store';

/** Lets a signed-in person pass; sends everybody else to sign in, and back here afterwards. */
export const signInGuard: CanActivateFn = (_route, state) => {
  const router = inject(Router);
  return inject(SessionStore)
    .ready()
    .pipe(map((view) => placeFor(view, state.url, router)));
};

/** Only for whoever is not signed in yet. */
export const signedOutGuard: CanActivateFn = () => {
  const router = inject(Router);
  return inject(SessionStore)
    .ready()
    .pipe(map((view) => (view.person === null ? true : router.parseUrl('/desk'))));
};

/** Only for administrators; everybody else is taken to their desk. */
export const administratorGuard: CanActivateFn = () =>
  inject(SessionStore).administrator() || inject(Router).parseUrl('/desk');

function placeFor(view: SessionView, url: string, router: Router): true | UrlTree {
  if (view.firstAdministratorNeeded) return router.parseUrl('/first-administrator');
  if (view.person !== null) return true;
  const queryParams = url === '/' || url === '/desk' ? {} : { then: url };
  return router.createUrlTree(['/sign-in'], { queryParams });
}
