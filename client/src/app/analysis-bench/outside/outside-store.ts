import { computed, inject, Injectable, signal } from '@angular/core';
import type { OutsideEstimate } from '#shared/outside-estimates';
import { type EstimatePlace, OutsideEstimatesApi } from '../../server-api/outside-estimates-api';
import { PHRASEBOOK } from '../../ui/phrasebook';
import { Notices } from '../../ui/notices/notices';
import { BenchStore } from '../bench/bench-store';
import { type OutsidePrint, outsideRows } from './outside-rows';

/** The estimates from elsewhere beside the analysis that is saved. */
@Injectable()
export class OutsideStore {
  private readonly bench = inject(BenchStore);
  private readonly api = inject(OutsideEstimatesApi);
  private readonly notices = inject(Notices);
  private readonly book = inject(PHRASEBOOK);

  readonly busy = signal(false);

  /** Null while nothing is saved that an estimate could stand beside. */
  readonly print = computed<OutsidePrint | null>(() => {
    const [saved, style] = [this.bench.saved(), this.bench.houseStyle()];
    return saved === null || style === null
      ? null
      : { result: saved.result, style, book: this.book };
  });
  readonly place = computed<EstimatePlace | null>(() => {
    const [saved, study] = [this.bench.saved(), this.bench.study()];
    return saved === null || study === null ? null : { studyId: study.id, analysisId: saved.id };
  });
  readonly rows = computed(() => {
    const print = this.print();
    return print === null ? [] : outsideRows(this.bench.saved()?.outside ?? [], print);
  });

  /** What the checks found, each sentence once with the estimates that it is about. */
  readonly notes = computed(() => {
    const rows = this.rows();
    const words = new Set(rows.flatMap(({ notes }) => notes.map((note) => note.words)));
    return [...words].flatMap((said) => {
      const about = rows.filter(({ notes }) => notes.some((note) => note.words === said));
      const note = about[0]?.notes.find((one) => one.words === said);
      const subject = about.map(({ level, measure }) => `${level}, ${measure}`).join('; ');
      return note === undefined ? [] : [{ ...note, subject }];
    });
  });

  /** Lists an estimate that was added or changed. */
  take(estimate: OutsideEstimate): void {
    this.update((estimates) => {
      const known = estimates.some(({ id }) => id === estimate.id);
      return known
        ? estimates.map((one) => (one.id === estimate.id ? estimate : one))
        : [...estimates, estimate];
    });
  }

  /** Removes an estimate and offers to put it back. */
  remove(estimate: OutsideEstimate): void {
    const place = this.place();
    if (place === null || this.busy()) return;
    this.busy.set(true);
    this.api.remove(place, estimate.id).subscribe({
      next: () => {
        this.busy.set(false);
        this.update((estimates) => estimates.filter(({ id }) => id !== estimate.id));
        this.notices.offer('The estimate is removed.', 'Undo', () => {
          this.putBack(place, estimate);
        });
      },
      error: (failure: unknown) => {
        this.busy.set(false);
        this.notices.refuse(failure);
      },
    });
  }

  private putBack(place: EstimatePlace, estimate: OutsideEstimate): void {
    this.api.add(place, estimate).subscribe({
      next: (added) => {
        this.take(added);
      },
      error: (failure: unknown) => {
        this.notices.refuse(failure);
      },
    });
  }

  private update(
    change: (estimates: readonly OutsideEstimate[]) => readonly OutsideEstimate[],
  ): void {
    this.bench.saved.update((saved) =>
      saved === null ? null : { ...saved, outside: [...change(saved.outside ?? [])] },
    );
  }
}
