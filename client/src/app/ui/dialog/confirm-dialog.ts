import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MAT_DIALOG_DATA, MatDialogRef } from '@angular/material/dialog';
import { DialogFrame } from './dialog-frame';

/** A question with two verbs for an answer. */
export interface Confirmation {
  /** As in "Move the report to cut 4?" */
  readonly question: string;
  /** What happens, and what stays. */
  readonly consequence: string;
  /** The safe choice, as in "Stay on cut 3". */
  readonly keep: string;
  /** The act, as in "Move to cut 4". */
  readonly act: string;
}

/** Asks before something that cannot be taken back. Closes with true when the act was chosen. */
@Component({
  selector: 'eh-confirm-dialog',
  imports: [DialogFrame],
  template: `
    <eh-dialog-frame [question]="ask.question">
      <p>{{ ask.consequence }}</p>
      <ng-container dialogActions>
        <button type="button" class="button" (click)="close(false)">{{ ask.keep }}</button>
        <button type="button" class="button primary" (click)="close(true)">{{ ask.act }}</button>
      </ng-container>
    </eh-dialog-frame>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ConfirmDialog {
  protected readonly ask = inject<Confirmation>(MAT_DIALOG_DATA);
  private readonly reference = inject<MatDialogRef<ConfirmDialog, boolean>>(MatDialogRef);

  protected close(acted: boolean): void {
    this.reference.close(acted);
  }
}
