import {
  ChangeDetectionStrategy,
  Component,
  inject,
  input,
  type OnInit,
  signal,
} from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import { RouterLink } from '@angular/router';
import { ApiProblem } from '../server-api/api-problem';
import { SessionApi } from '../server-api/session-api';
import { Field } from '../ui/field/field';
import { FieldControl } from '../ui/field/field-control';
import { FocusProblem } from '../ui/field/focus-problem';
import { FormProblems } from '../ui/field/form-problems';
import { ProblemPanel } from '../ui/status/problem-panel';

const ADDRESS_WANTED = 'Give an e-mail address such as name@example.org.';

/** Asks for the mail with the link. Says the same whether or not the address has an account. */
@Component({
  selector: 'eh-request-reset-form',
  imports: [Field, FieldControl, FocusProblem, ProblemPanel, ReactiveFormsModule, RouterLink],
  templateUrl: './request-reset-form.html',
  styleUrl: './sign-in-form.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RequestResetForm implements OnInit {
  readonly address = input.required<string>();

  private readonly api = inject(SessionApi);
  protected readonly sentTo = signal<string | null>(null);
  protected readonly busy = signal(false);
  protected readonly form = new FormGroup({
    email: new FormControl('', {
      nonNullable: true,
      validators: [Validators.required, Validators.email],
    }),
  });
  protected readonly problems = new FormProblems(this.form, {
    email: { required: ADDRESS_WANTED, email: ADDRESS_WANTED },
  });

  ngOnInit(): void {
    this.form.setValue({ email: this.address() });
  }

  protected ask(): void {
    if (this.busy() || !this.problems.check()) return;
    const request = this.form.getRawValue();
    this.busy.set(true);
    this.api.requestPasswordReset(request).subscribe({
      next: () => {
        this.sentTo.set(request.email);
      },
      error: (failure: unknown) => {
        this.busy.set(false);
        this.problems.refuse(ApiProblem.from(failure));
      },
    });
  }
}
