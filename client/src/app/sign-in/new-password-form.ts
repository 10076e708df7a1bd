import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule } from '@angular/forms';
import { RouterLink } from '@angular/router';
import { ApiProblem } from '../server-api/api-problem';
import { SessionApi } from '../server-api/session-api';
import { FocusProblem } from '../ui/field/focus-problem';
import { FormProblems } from '../ui/field/form-problems';
import { ProblemPanel } from '../ui/status/problem-panel';
import { PASSWORD_MESSAGES, PASSWORD_VALIDATORS } from '../ui/password/new-password';
import { PasswordInput } from '../ui/password/password-input';

/** Takes the new password of whoever followed the link of a mail. */
@Component({
  selector: 'eh-new-password-form',
  imports: [FocusProblem, PasswordInput, ProblemPanel, ReactiveFormsModule, RouterLink],
  templateUrl: './new-password-form.html',
  styleUrl: './sign-in-form.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NewPasswordForm {
  readonly token = input.required<string>();

  private readonly api = inject(SessionApi);
  protected readonly done = signal(false);
  protected readonly busy = signal(false);
  protected readonly form = new FormGroup({
    newPassword: new FormControl('', { nonNullable: true, validators: PASSWORD_VALIDATORS }),
  });
  protected readonly problems = new FormProblems(this.form, { newPassword: PASSWORD_MESSAGES });

  protected save(): void {
    if (this.busy() || !this.problems.check()) return;
    this.busy.set(true);
    const request = { token: this.token(), ...this.form.getRawValue() };
    this.api.completePasswordReset(request).subscribe({
      next: () => {
        this.done.set(true);
      },
      error: (failure: unknown) => {
        this.busy.set(false);
        this.problems.refuse(ApiProblem.from(failure));
      },
    });
  }
}
