import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import { MAT_DIALOG_DATA } from '@angular/material/dialog';
import { of } from 'rxjs';
import { DialogFrame } from '../../ui/dialog/dialog-frame';
import { FormDialog } from '../../ui/dialog/form-dialog';
import { Field } from '../../ui/field/field';
import { FieldControl } from '../../ui/field/field-control';

/** Asks why an analysis is changed that reports show already. Closes with the reason. */
@Component({
  selector: 'eh-reason-dialog',
  imports: [DialogFrame, Field, FieldControl, ReactiveFormsModule],
  template: `
    <form [formGroup]="form" (ngSubmit)="save()" novalidate>
      <eh-dialog-frame question="Why is this analysis changed?">
        <p>
          Its result was seen already: {{ reports.join(', ') }}
          {{ reports.length === 1 ? 'shows' : 'show' }} it. The reason is kept and printed with the
          methods.
        </p>
        <eh-field label="Reason" [problem]="dialog.problems.of('reason')">
          <textarea ehControl class="input" maxlength="1000" formControlName="reason"></textarea>
        </eh-field>
        <ng-container dialogActions>
          <button type="button" class="button" (click)="dialog.leave()">Go on editing</button>
          <button class="button primary">Save with this reason</button>
        </ng-container>
      </eh-dialog-frame>
    </form>
  `,
  styles: `
    p {
      padding-bottom: 12px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ReasonDialog {
  protected readonly reports = inject<readonly string[]>(MAT_DIALOG_DATA);
  protected readonly form = new FormGroup({
    reason: new FormControl('', {
      nonNullable: true,
      validators: [Validators.required, Validators.pattern(/\S/)],
    }),
  });
  protected readonly dialog = new FormDialog<string>(this.form, {
    reason: {
      required: 'Say why, in a sentence.',
      pattern: 'Say why, in a sentence.',
    },
  });

  protected save(): void {
    this.dialog.send(() => of(this.form.getRawValue().reason.trim()));
  }
}
