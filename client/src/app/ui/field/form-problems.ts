import { computed, type Signal, signal } from '@angular/core';
import type { AbstractControl, FormGroup } from '@angular/forms';
import type { ApiProblem } from '../../server-api/api-problem';

/** What to say about a control that fails a validator, by control name and validator key. */
export type FieldMessages = Readonly<Record<string, Readonly<Record<string, string>>>>;

/**
 * What is wrong with each field of a form: first what the page itself can tell, then what the
 * server said. Nothing is said before the form was submitted or the field was left.
 */
export class FormProblems {
  private readonly version = signal(0);
  private readonly refused = signal<ApiProblem | null>(null);

  /** How often the form was sent and not accepted. */
  readonly refusals = signal(0);

  /** What the server refused last. */
  readonly problem: Signal<ApiProblem | null> = this.refused.asReadonly();

  /** What the server refused, when no field of the form shows why. */
  readonly unexplained = computed(() => {
    const problem = this.refused();
    const shown = problem?.fields.some((field) => this.form.get(field.path) !== null);
    return shown === true ? null : problem;
  });

  constructor(
    private readonly form: FormGroup,
    private readonly messages: FieldMessages,
  ) {
    form.events.subscribe(() => {
      this.version.update((version) => version + 1);
    });
  }

  /** The message for a field, or null. Reads signals. */
  of(name: string): string | null {
    this.version();
    const control = this.form.get(name);
    return ownMessage(control, this.messages[name] ?? {}) ?? this.refusedFor(name, control);
  }

  /** Whether the form may be sent; shows every problem when it may not. */
  check(): boolean {
    this.refused.set(null);
    this.form.markAllAsTouched();
    this.version.update((version) => version + 1);
    if (!this.form.valid) this.countRefusal();
    return this.form.valid;
  }

  /** Shows what the server refused. Every field starts to be its own again once it is changed. */
  refuse(problem: ApiProblem): void {
    this.refused.set(problem);
    for (const field of problem.fields) this.form.get(field.path)?.markAsPristine();
    this.version.update((version) => version + 1);
    this.countRefusal();
  }

  private countRefusal(): void {
    this.refusals.update((count) => count + 1);
  }

  private refusedFor(name: string, control: AbstractControl | null): string | null {
    return control?.dirty === true ? null : (this.refused()?.fieldMessage(name) ?? null);
  }
}

function ownMessage(
  control: AbstractControl | null,
  messages: Readonly<Record<string, string>>,
): string | null {
  if (control === null || !control.touched || control.errors === null) return null;
  const failed = Object.keys(control.errors)[0] ?? '';
  return messages[failed] ?? null;
}
