import {
  ChangeDetectionStrategy,
  Component,
  computed,
  type ElementRef,
  inject,
  input,
  signal,
  viewChild,
} from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import { Router, RouterLink } from '@angular/router';
import { ApiProblem } from '../server-api/api-problem';
import { SessionStore } from '../session/session-store';
import { Field } from '../ui/field/field';
import { FieldControl } from '../ui/field/field-control';
import { FocusProblem } from '../ui/field/focus-problem';
import { FormProblems } from '../ui/field/form-problems';
import { afterSignIn } from './after-sign-in';
import { PasswordInput } from '../ui/password/password-input';
import { SignInLayout } from './sign-in-layout';

const MESSAGES = {
  email: { required: 'Give your e-mail address.' },
  password: { required: 'Give your password.' },
};

/** Signing in, with the documented accounts at hand where the data are for demonstration. */
@Component({
  selector: 'eh-sign-in-page',
  imports: [
    Field,
    FieldControl,
    FocusProblem,
    PasswordInput,
    ReactiveFormsModule,
    RouterLink,
    SignInLayout,
  ],
  templateUrl: './sign-in-page.html',
  styleUrls: ['./sign-in-form.scss', './sign-in-page.scss'],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SignInPage {
  /** Query parameter: the address to go back to. */
  readonly then = input<string>();

  private readonly router = inject(Router);
  private readonly session = inject(SessionStore);
  private readonly submit = viewChild.required<ElementRef<HTMLButtonElement>>('submit');

  protected readonly demonstration = computed(() =>
    (this.session.view()?.demonstrationAccounts ?? []).map(({ email, role }) => ({
      email,
      role: role.charAt(0).toUpperCase() + role.slice(1),
    })),
  );
  protected readonly busy = signal(false);
  protected readonly form = new FormGroup({
    email: new FormControl('', { nonNullable: true, validators: [Validators.required] }),
    password: new FormControl('', { nonNullable: true, validators: [Validators.required] }),
  });
  protected readonly problems = new FormProblems(this.form, MESSAGES);
  protected readonly passwordProblem = computed(
    () => this.problems.of('password') ?? this.problems.unexplained()?.title ?? null,
  );

  protected fillIn(email: string): void {
    this.form.setValue({ email, password: this.session.view()?.demonstrationPassword ?? '' });
    this.submit().nativeElement.focus();
  }

  protected signIn(): void {
    if (this.busy() || !this.problems.check()) return;
    this.busy.set(true);
    this.session.signIn(this.form.getRawValue()).subscribe({
      next: () => void this.router.navigateByUrl(afterSignIn(this.then() ?? null)),
      error: (failure: unknown) => {
        this.busy.set(false);
        this.problems.refuse(ApiProblem.from(failure));
      },
    });
  }
}
