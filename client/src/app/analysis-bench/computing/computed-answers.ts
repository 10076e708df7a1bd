import { DestroyRef, inject, Injectable, signal } from '@angular/core';
import { Computing } from './computing';
import type { ComputingAnswers, ComputingTask } from './computing-task';

type Kind = ComputingTask['kind'];
type TaskOf<Of extends Kind> = Extract<ComputingTask, { kind: Of }>;

/** How far the answer to a task is. */
export type AnswerState<Of extends Kind> =
  | { readonly kind: 'computing' }
  | { readonly kind: 'computed'; readonly answer: ComputingAnswers[Of] }
  | { readonly kind: 'broken' };

/** Answers to tasks that take their time, kept by a key: equal keys have the same answer. */
@Injectable()
export class ComputedAnswers {
  private readonly computing = inject(Computing);
  private readonly states = signal<ReadonlyMap<string, AnswerState<Kind>>>(new Map());
  private ended = false;

  constructor() {
    inject(DestroyRef).onDestroy(() => {
      this.ended = true;
    });
  }

  /** Undefined where the task was not asked for. A key belongs to one kind of task. */
  stateOf<Of extends Kind>(key: string): AnswerState<Of> | undefined {
    return this.states().get(key) as AnswerState<Of> | undefined;
  }

  /** Computes, unless it is known already or under way. */
  want<Of extends Kind>(key: string, task: TaskOf<Of>): void {
    const kind = this.states().get(key)?.kind;
    if (kind === 'computing' || kind === 'computed') return;
    this.keep(key, { kind: 'computing' });
    this.computing.perform<Of>(task).subscribe({
      next: (answer) => {
        this.keep(key, { kind: 'computed', answer });
      },
      error: () => {
        this.keep(key, { kind: 'broken' });
      },
    });
  }

  private keep(key: string, state: AnswerState<Kind>): void {
    if (!this.ended) this.states.update((states) => new Map([...states, [key, state]]));
  }
}
