import { DestroyRef, inject, Injectable, signal } from '@angular/core';
import type { Result } from '#shared/core';
import type { Estimate, EstimationIssue } from '#shared/stats';
import { Computing } from '../computing/computing';
import { type MethodQuestion, questionKey } from './method-question';

/** How far the answer of a method that takes its time is. */
export type AnswerState =
  | { readonly kind: 'computing' }
  | { readonly kind: 'computed'; readonly estimate: Result<Estimate, EstimationIssue> }
  | { readonly kind: 'broken' };

/** Answers of methods that take their time, by what was asked. */
@Injectable()
export class MethodAnswers {
  private readonly computing = inject(Computing);
  private readonly states = signal<ReadonlyMap<string, AnswerState>>(new Map());
  private ended = false;

  constructor() {
    inject(DestroyRef).onDestroy(() => {
      this.ended = true;
    });
  }

  stateOf(question: MethodQuestion): AnswerState | undefined {
    return this.states().get(questionKey(question));
  }

  /** The estimate of a method, once it is computed. */
  known(question: MethodQuestion): Result<Estimate, EstimationIssue> | null {
    const state = this.stateOf(question);
    return state?.kind === 'computed' ? state.estimate : null;
  }

  ask(question: MethodQuestion): void {
    this.keep(question, { kind: 'computing' });
    this.computing.perform<'method'>({ kind: 'method', question }).subscribe({
      next: (estimate) => {
        this.keep(question, { kind: 'computed', estimate });
      },
      error: () => {
        this.keep(question, { kind: 'broken' });
      },
    });
  }

  private keep(question: MethodQuestion, state: AnswerState): void {
    if (this.ended) return;
    this.states.update((states) => new Map([...states, [questionKey(question), state]]));
  }
}
