import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import { ApiProblem } from '../server-api/api-problem';
import { SessionApi } from '../server-api/session-api';
import { FocusProblem } from '../ui/field/focus-problem';
import { FormProblems } from '../ui/field/form-problems';
import { PASSWORD_HELP, PASSWORD_MESSAGES, PASSWORD_VALIDATORS } from '../ui/password/new-password';
import { PasswordInput } from '../ui/password/password-input';
import { Notices } from '../ui/notices/notices';
import { ProblemPanel } from '../ui/status/problem-panel';

/** Changes the password of whoever is signed in. */
@Component({
  selector: 'eh-password-change',
  imports: [FocusProblem, PasswordInput, ProblemPanel, ReactiveFormsModule],
  templateUrl: './password-change.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PasswordChange {
  private readonly api = inject(SessionApi);
  private readonly notices = inject(Notices);

  protected readonly help = PASSWORD_HELP;
  protected readonly busy = signal(false);
  protected readonly form = new FormGroup({
    currentPassword: new FormControl('', { nonNullable: true, validators: [Validators.required] }),
    newPassword: new FormControl('', { nonNullable: true, validators: PASSWORD_VALIDATORS }),
  });
  protected readonly problems = new FormProblems(this.form, {
    currentPassword: { required: 'Give your present password.' },
    newPassword: PASSWORD_MESSAGES,
  });

  protected save(): void {
    if (this.busy() || !this.problems.check()) return;
    this.busy.set(true);
    this.api.changePassword(this.form.getRawValue()).subscribe({
      next: () => {
        this.busy.set(false);
        this.form.reset();
        this.notices.say('Your password is changed. Other sessions have ended.');
      },
      error: (failure: unknown) => {
        this.busy.set(false);
        this.problems.refuse(ApiProblem.from(failure));
      },
    });
  }
}
