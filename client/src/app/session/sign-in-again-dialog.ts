import { ChangeDetectionStrategy, Component, inject, type Injector, signal } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatDialog, MatDialogRef } from '@angular/material/dialog';
import { firstValueFrom } from 'rxjs';
import { ApiProblem } from '../server-api/api-problem';
import { DialogFrame } from '../ui/dialog/dialog-frame';
import { DIALOG_SIZE } from '../ui/dialog/dialog-size';
import { Field } from '../ui/field/field';
import { FieldControl } from '../ui/field/field-control';
import { FocusProblem } from '../ui/field/focus-problem';
import { FormProblems } from '../ui/field/form-problems';
import { SessionStore } from './session-store';

/** Whether the person signed in again, over the page that they were on. */
export async function askForPassword(injector: Injector): Promise<boolean> {
  const dialog = injector
    .get(MatDialog)
    .open<SignInAgainDialog, undefined, boolean>(SignInAgainDialog, {
      ...DIALOG_SIZE,
      disableClose: true,
    });
  return (await firstValueFrom(dialog.afterClosed())) ?? false;
}

/** One password field over the page; the page behind keeps what was typed. */
@Component({
  selector: 'eh-sign-in-again-dialog',
  imports: [DialogFrame, Field, FieldControl, FocusProblem, ReactiveFormsModule],
  templateUrl: './sign-in-again-dialog.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SignInAgainDialog {
  private readonly session = inject(SessionStore);
  private readonly reference = inject<MatDialogRef<SignInAgainDialog, boolean>>(MatDialogRef);

  protected readonly email = this.session.person()?.email ?? '';
  protected readonly busy = signal(false);
  protected readonly form = new FormGroup({
    password: new FormControl('', { nonNullable: true, validators: [Validators.required] }),
  });
  protected readonly problems = new FormProblems(this.form, {
    password: { required: 'Give your password.' },
  });

  protected signIn(): void {
    if (this.busy() || !this.problems.check()) return;
    this.busy.set(true);
    this.session.signIn({ email: this.email, ...this.form.getRawValue() }).subscribe({
      next: () => {
        this.reference.close(true);
      },
      error: (failure: unknown) => {
        this.busy.set(false);
        this.problems.refuse(ApiProblem.from(failure));
      },
    });
  }

  protected leave(): void {
    this.reference.close(false);
  }
}
