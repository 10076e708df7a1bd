import { DestroyRef, DOCUMENT, inject } from '@angular/core';
import { TextEditSession } from '../block-editors/text-edit-session';
import { SaveState } from '../report-store/save-state';

/** Makes steps of open words when the page goes out of sight, and warns while work is unsent. */
export function leavingWarning(): void {
  const view = inject(DOCUMENT).defaultView;
  const session = inject(TextEditSession);
  const saved = inject(SaveState);
  const hide = (): void => {
    session.commit();
  };
  const leave = (event: BeforeUnloadEvent): void => {
    session.commit();
    if (saved.unsent()) event.preventDefault();
  };
  view?.addEventListener('pagehide', hide);
  view?.addEventListener('beforeunload', leave);
  inject(DestroyRef).onDestroy(() => {
    view?.removeEventListener('pagehide', hide);
    view?.removeEventListener('beforeunload', leave);
  });
}
