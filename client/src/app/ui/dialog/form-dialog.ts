import { inject, signal } from '@angular/core';
import type { FormGroup } from '@angular/forms';
import { MatDialogRef } from '@angular/material/dialog';
import type { Observable } from 'rxjs';
import { ApiProblem } from '../../server-api/api-problem';
import { type FieldMessages, FormProblems } from '../field/form-problems';

/** What a dialog with a form does besides its fields: checks, sends, closes with the answer. */
export class FormDialog<Answer> {
  private readonly reference = inject<MatDialogRef<unknown, Answer>>(MatDialogRef);

  readonly busy = signal(false);
  readonly problems: FormProblems;

  constructor(form: FormGroup, messages: FieldMessages) {
    this.problems = new FormProblems(form, messages);
  }

  /** Sends what `request` makes, unless the form shows a problem; stays open when it is refused. */
  send(request: () => Observable<Answer>): void {
    if (this.busy() || !this.problems.check()) return;
    this.busy.set(true);
    request().subscribe({
      next: (answer) => {
        this.reference.close(answer);
      },
      error: (failure: unknown) => {
        this.busy.set(false);
        this.problems.refuse(ApiProblem.from(failure));
      },
    });
  }

  leave(): void {
    this.reference.close();
  }
}
