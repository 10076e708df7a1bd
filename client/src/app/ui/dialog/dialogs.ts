import { inject, Injectable, type Type } from '@angular/core';
import { MatDialog } from '@angular/material/dialog';
import { filter, type Observable } from 'rxjs';
import { DIALOG_SIZE } from './dialog-size';

/** Opens dialogs with a form. */
@Injectable({ providedIn: 'root' })
export class Dialogs {
  private readonly dialog = inject(MatDialog);

  /** Emits the answer that the dialog closes with; completes silently when it was left. */
  open<Answer>(dialog: Type<unknown>, data: unknown = null): Observable<Answer> {
    return this.dialog
      .open<unknown, unknown, Answer>(dialog, { ...DIALOG_SIZE, data })
      .afterClosed()
      .pipe(filter((answer) => answer !== undefined));
  }
}
