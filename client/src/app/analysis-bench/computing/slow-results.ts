import { DestroyRef, inject, Injectable, signal } from '@angular/core';
import type {
  AnalysisIssue,
  AnalysisResult,
  AnalysisSpecification,
  ResultFrame,
} from '#shared/analysis';
import type { Result } from '#shared/core';
import type { Tally } from '#shared/tally';
import { Computing } from './computing';

/** An analysis to compute. Equal keys give the same result. */
export interface WantedResult {
  readonly key: string;
  readonly specification: AnalysisSpecification;
  readonly frame: ResultFrame;
  readonly tally: Tally;
}

/** How far a result is. */
export type SlowState =
  | { readonly kind: 'computing' }
  | { readonly kind: 'computed'; readonly result: Result<AnalysisResult, AnalysisIssue> }
  | { readonly kind: 'broken' };

/** Results of analyses whose methods take their time, by what was wanted. */
@Injectable()
export class SlowResults {
  private readonly computing = inject(Computing);
  private readonly states = signal<ReadonlyMap<string, SlowState>>(new Map());
  private ended = false;

  constructor() {
    inject(DestroyRef).onDestroy(() => {
      this.ended = true;
    });
  }

  stateOf({ key }: WantedResult): SlowState {
    return this.states().get(key) ?? { kind: 'computing' };
  }

  /** Computes, unless it is known already or under way. */
  want(wanted: WantedResult): void {
    const state = this.states().get(wanted.key);
    if (state === undefined || state.kind === 'broken') this.compute(wanted);
  }

  private compute({ key, specification, frame, tally }: WantedResult): void {
    this.keep(key, { kind: 'computing' });
    this.computing
      .perform<'analysis'>({ kind: 'analysis', specification, frame, tally })
      .subscribe({
        next: (result) => {
          this.keep(key, { kind: 'computed', result });
        },
        error: () => {
          this.keep(key, { kind: 'broken' });
        },
      });
  }

  private keep(key: string, state: SlowState): void {
    if (!this.ended) this.states.update((states) => new Map([...states, [key, state]]));
  }
}
