import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { MatDialogModule } from '@angular/material/dialog';

/**
 * The inside of a dialog: a question as title, its text as content, and `[dialogActions]` at the
 * foot, safe choice first. Open it through `MatDialog` with `DIALOG_SIZE`.
 */
@Component({
  selector: 'eh-dialog-frame',
  imports: [MatDialogModule],
  template: `
    <h2 mat-dialog-title>{{ question() }}</h2>
    <mat-dialog-content><ng-content /></mat-dialog-content>
    <mat-dialog-actions align="end"><ng-content select="[dialogActions]" /></mat-dialog-actions>
  `,
  styleUrl: './dialog-frame.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DialogFrame {
  readonly question = input.required<string>();
}
