import { computed, DestroyRef, inject, Injectable, signal } from '@angular/core';
import type { Tally, TallyRequest } from '#shared/tally';
import { ApiProblem } from '../../server-api/api-problem';
import { DataApi } from '../../server-api/data-api';

/** What has to be counted. Equal keys count the same. */
export interface WantedCounts {
  readonly key: string;
  readonly studyId: string;
  readonly cutId: string;
  readonly request: TallyRequest;
}

/** How far the counting is. */
export type CountsState =
  | { readonly kind: 'counting' }
  | { readonly kind: 'counted'; readonly tally: Tally }
  | { readonly kind: 'refused'; readonly problem: ApiProblem };

/** Makes the wish for counts; the code book's number is part of it, since it decides the levels. */
export function wantedCounts(
  place: { readonly studyId: string; readonly cutId: string; readonly codeBookNumber: number },
  request: TallyRequest,
): WantedCounts {
  const { studyId, cutId, codeBookNumber } = place;
  const { columnIds, restrictions } = request;
  const parts = [cutId, codeBookNumber, columnIds, restrictions];
  return { key: JSON.stringify(parts), studyId, cutId, request };
}

/** Counts by what was asked for; the server is asked once for each. */
@Injectable()
export class CountsStore {
  private readonly api = inject(DataApi);
  private readonly states = signal<ReadonlyMap<string, CountsState>>(new Map());
  private ended = false;

  readonly known = computed(() => this.states());

  constructor() {
    inject(DestroyRef).onDestroy(() => {
      this.ended = true;
    });
  }

  /** Counts, unless it is known already or under way. */
  want(wanted: WantedCounts): void {
    if (this.states().has(wanted.key)) return;
    this.keep(wanted.key, { kind: 'counting' });
    this.api.count(wanted.studyId, wanted.cutId, wanted.request).subscribe({
      next: (tally) => {
        this.keep(wanted.key, { kind: 'counted', tally });
      },
      error: (failure: unknown) => {
        this.keep(wanted.key, { kind: 'refused', problem: ApiProblem.from(failure) });
      },
    });
  }

  /** Counts again what was refused. */
  again(wanted: WantedCounts): void {
    this.states.update((states) => {
      const others = new Map(states);
      others.delete(wanted.key);
      return others;
    });
    this.want(wanted);
  }

  private keep(key: string, state: CountsState): void {
    if (!this.ended) this.states.update((states) => new Map([...states, [key, state]]));
  }
}
