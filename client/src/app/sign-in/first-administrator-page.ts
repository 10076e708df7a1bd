import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import { Router } from '@angular/router';
import { ApiProblem } from '../server-api/api-problem';
import { SessionStore } from '../session/session-store';
import { Field } from '../ui/field/field';
import { FieldControl } from '../ui/field/field-control';
import { FocusProblem } from '../ui/field/focus-problem';
import { FormProblems } from '../ui/field/form-problems';
import { ProblemPanel } from '../ui/status/problem-panel';
import { PASSWORD_MESSAGES, PASSWORD_VALIDATORS } from '../ui/password/new-password';
import { PasswordInput } from '../ui/password/password-input';
import { SignInLayout } from './sign-in-layout';

const MESSAGES = {
  code: { required: 'Give the code that the server printed when it started.' },
  name: { required: 'Give your name.' },
  email: {
    required: 'Give an e-mail address such as name@example.org.',
    email: 'Give an e-mail address such as name@example.org.',
  },
  password: PASSWORD_MESSAGES,
};

/** The first start without demonstration data: whoever started the server becomes administrator. */
@Component({
  selector: 'eh-first-administrator-page',
  imports: [
    Field,
    FieldControl,
    FocusProblem,
    PasswordInput,
    ProblemPanel,
    ReactiveFormsModule,
    SignInLayout,
  ],
  templateUrl: './first-administrator-page.html',
  styleUrl: './sign-in-form.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FirstAdministratorPage {
  private readonly router = inject(Router);
  private readonly session = inject(SessionStore);

  protected readonly busy = signal(false);
  protected readonly form = new FormGroup({
    code: new FormControl('', { nonNullable: true, validators: [Validators.required] }),
    name: new FormControl('', { nonNullable: true, validators: [Validators.required] }),
    email: new FormControl('', {
      nonNullable: true,
      validators: [Validators.required, Validators.email],
    }),
    password: new FormControl('', { nonNullable: true, validators: PASSWORD_VALIDATORS }),
  });
  protected readonly problems = new FormProblems(this.form, MESSAGES);

  protected create(): void {
    if (this.busy() || !this.problems.check()) return;
    this.busy.set(true);
    this.session.createFirstAdministrator(this.form.getRawValue()).subscribe({
      next: () => void this.router.navigateByUrl('/desk'),
      error: (failure: unknown) => {
        this.busy.set(false);
        this.problems.refuse(ApiProblem.from(failure));
      },
    });
  }
}
