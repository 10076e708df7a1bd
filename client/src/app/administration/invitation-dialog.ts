import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import type { Account } from '#shared/api';
import { AdministrationApi } from '../server-api/administration-api';
import { DialogFrame } from '../ui/dialog/dialog-frame';
import { FormDialog } from '../ui/dialog/form-dialog';
import { Field } from '../ui/field/field';
import { FieldControl } from '../ui/field/field-control';
import { FocusProblem } from '../ui/field/focus-problem';
import { ProblemPanel } from '../ui/status/problem-panel';

const ADDRESS_WANTED = 'Give an e-mail address such as name@example.org.';

/** Name and address of somebody new. */
@Component({
  selector: 'eh-invitation-dialog',
  imports: [DialogFrame, Field, FieldControl, FocusProblem, ProblemPanel, ReactiveFormsModule],
  templateUrl: './invitation-dialog.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class InvitationDialog {
  private readonly api = inject(AdministrationApi);

  protected readonly form = new FormGroup({
    name: new FormControl('', { nonNullable: true, validators: [Validators.required] }),
    email: new FormControl('', {
      nonNullable: true,
      validators: [Validators.required, Validators.email],
    }),
    administrator: new FormControl(false, { nonNullable: true }),
  });
  protected readonly dialog = new FormDialog<Account>(this.form, {
    name: { required: 'Give a name.' },
    email: { required: ADDRESS_WANTED, email: ADDRESS_WANTED },
  });

  protected save(): void {
    this.dialog.send(() => this.api.createAccount(this.form.getRawValue()));
  }
}
