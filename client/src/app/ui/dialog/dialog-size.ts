import type { MatDialogConfig } from '@angular/material/dialog';

/** How wide dialogs are, and where the focus goes. */
export const DIALOG_SIZE = {
  width: '520px',
  maxWidth: 'calc(100vw - 24px)',
  autoFocus: 'first-tabbable',
  restoreFocus: true,
} as const satisfies MatDialogConfig;
