import { inject } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { type ActivatedRouteSnapshot, NavigationEnd, type Route, Router } from '@angular/router';
import { filter, map, pairwise, startWith } from 'rxjs';

/**
 * Moves the focus to the page when another page comes into view, so that reading starts there.
 * Within one page (another analysis, another tab) the focus stays where it is.
 */
export function focusAfterNavigation(page: () => HTMLElement): void {
  const router = inject(Router);
  router.events
    .pipe(
      filter((event) => event instanceof NavigationEnd),
      map(() => pageInView(router)),
      startWith(pageInView(router)),
      pairwise(),
      filter(([before, now]) => before !== null && before !== now),
      takeUntilDestroyed(),
    )
    .subscribe(() => {
      page().scrollTo({ top: 0 });
      page().focus({ preventScroll: true });
    });
}

function pageInView(router: Router): Route | null {
  let snapshot: ActivatedRouteSnapshot = router.routerState.snapshot.root;
  while (snapshot.firstChild !== null) snapshot = snapshot.firstChild;
  return snapshot.routeConfig;
}
