import { inject, Injector } from '@angular/core';
import type { CanDeactivateFn } from '@angular/router';
import { from, switchMap } from 'rxjs';

/** A page that may hold work which is not saved. */
export interface HoldsUnsavedWork {
  hasUnsavedWork(): boolean;
}

/** Asks before a page with unsaved work is left. */
export const unsavedWorkGuard: CanDeactivateFn<HoldsUnsavedWork> = (page) => {
  if (!page.hasUnsavedWork()) return true;
  const injector = inject(Injector);
  return from(import('./dialog/confirm')).pipe(
    switchMap(({ Confirm }) =>
      injector.get(Confirm).ask({
        question: 'Leave without saving?',
        consequence: 'What you changed here is not saved and would be lost.',
        keep: 'Stay here',
        act: 'Leave without saving',
      }),
    ),
  );
};
