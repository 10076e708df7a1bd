import {
  afterNextRender,
  Directive,
  effect,
  ElementRef,
  inject,
  Injector,
  input,
} from '@angular/core';
import type { FormProblems } from './form-problems';

/** Takes a person to the first field that is wrong, after their form was not accepted. */
@Directive({ selector: 'form[ehFocusProblem]' })
export class FocusProblem {
  readonly problems = input.required<FormProblems>({ alias: 'ehFocusProblem' });

  private readonly form = inject<ElementRef<HTMLFormElement>>(ElementRef).nativeElement;
  private readonly injector = inject(Injector);

  constructor() {
    effect(() => {
      if (this.problems().refusals() > 0) this.focusAfterRender();
    });
  }

  private focusAfterRender(): void {
    afterNextRender(
      () => {
        this.form.querySelector<HTMLElement>('[aria-invalid=true]')?.focus();
      },
      { injector: this.injector },
    );
  }
}
