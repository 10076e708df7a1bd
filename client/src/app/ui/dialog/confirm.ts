import { inject, Injectable } from '@angular/core';
import { MatDialog } from '@angular/material/dialog';
import { map, type Observable } from 'rxjs';
import { ConfirmDialog, type Confirmation } from './confirm-dialog';
import { DIALOG_SIZE } from './dialog-size';

/** Asks a person before something that cannot be taken back. */
@Injectable({ providedIn: 'root' })
export class Confirm {
  private readonly dialog = inject(MatDialog);

  /** True when the act was chosen; false when it was kept, or the dialog was left. */
  ask(confirmation: Confirmation): Observable<boolean> {
    return this.dialog
      .open<ConfirmDialog, Confirmation, boolean>(ConfirmDialog, {
        ...DIALOG_SIZE,
        role: 'alertdialog',
        data: confirmation,
      })
      .afterClosed()
      .pipe(map((acted) => acted ?? false));
  }
}
