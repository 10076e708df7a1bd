import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  linkedSignal,
  signal,
} from '@angular/core';
import type { CutView, RecordsPage } from '#shared/api';
import { ApiProblem } from '../../server-api/api-problem';
import { DataApi } from '../../server-api/data-api';
import { CurrentStudy } from '../../session/current-study';
import { ScrollSideways } from '../../ui/scroll-sideways';
import { ProblemPanel } from '../../ui/status/problem-panel';

const ROWS_A_PAGE = 50;

/** Single records of a cut, fifty at a time, once somebody asks for them. */
@Component({
  selector: 'eh-records-table',
  imports: [ProblemPanel, ScrollSideways],
  templateUrl: './records-table.html',
  styleUrl: './records-table.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RecordsTable {
  readonly cut = input.required<CutView>();

  private readonly api = inject(DataApi);
  private readonly study = inject(CurrentStudy).study;

  protected readonly isOpen = signal(false);
  protected readonly offset = linkedSignal({ source: this.cut, computation: () => 0 });
  protected readonly page = signal<RecordsPage | null>(null);
  protected readonly problem = signal<ApiProblem | null>(null);
  protected readonly range = computed(() => {
    const page = this.page();
    if (page === null || page.total === 0) return 'No records';
    const last = page.offset + page.rows.length;
    const shown = [page.offset + 1, last, page.total].map((number) => number.toLocaleString('en'));
    return `Records ${shown[0]} to ${shown[1]} of ${shown[2]}`;
  });
  protected readonly hasMore = computed(() => {
    const page = this.page();
    return page !== null && page.offset + page.rows.length < page.total;
  });

  constructor() {
    effect((onCleanup) => {
      if (!this.isOpen()) return;
      const window = { offset: this.offset(), limit: ROWS_A_PAGE };
      const reading = this.api
        .readRecords(this.study()?.id ?? '', this.cut().id, window)
        .subscribe({
          next: (page) => {
            this.problem.set(null);
            this.page.set(page);
          },
          error: (failure: unknown) => {
            this.problem.set(ApiProblem.from(failure));
          },
        });
      onCleanup(() => {
        reading.unsubscribe();
      });
    });
  }

  protected turn(pages: number): void {
    this.offset.update((offset) => Math.max(0, offset + pages * ROWS_A_PAGE));
  }
}
