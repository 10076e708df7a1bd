import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  signal,
} from '@angular/core';
import { RouterLink } from '@angular/router';
import type { CutView } from '#shared/api';
import { ApiProblem } from '../../server-api/api-problem';
import { DataApi } from '../../server-api/data-api';
import { CurrentStudy } from '../../session/current-study';
import { Bar, BarActions } from '../../ui/bar/bar';
import { COLUMN_KIND_WORDS, shownCode } from '../../ui/code-book-editor/column-words';
import { shortDate } from '../../ui/dates';
import { ScrollSideways } from '../../ui/scroll-sideways';
import { MarginNote } from '../../ui/status/margin-note';
import { ProblemPanel } from '../../ui/status/problem-panel';
import { RecordsTable } from './records-table';
import { GroupedNumberPipe } from '../../ui/grouped-number-pipe';

/** What a cut holds: its profile, and its records for whoever may see them. */
@Component({
  selector: 'eh-cut-page',
  imports: [
    Bar,
    BarActions,
    GroupedNumberPipe,
    MarginNote,
    ProblemPanel,
    RecordsTable,
    RouterLink,
    ScrollSideways,
  ],
  templateUrl: './cut-page.html',
  styleUrl: './cut-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CutPage {
  readonly cutId = input.required<string>();

  private readonly api = inject(DataApi);
  private readonly current = inject(CurrentStudy);

  protected readonly study = this.current.study;
  protected readonly cut = signal<CutView | null>(null);
  protected readonly problem = signal<ApiProblem | null>(null);
  protected readonly maySeeRecords = computed(() => this.current.may('seeRecords'));
  protected readonly mayEdit = computed(() => this.current.may('editData'));
  protected readonly home = computed(() => ['/studies', this.study()?.id ?? '']);
  protected readonly kindWords = COLUMN_KIND_WORDS;
  protected readonly date = shortDate;

  constructor() {
    effect((onCleanup) => {
      const reading = this.api.readCut(this.study()?.id ?? '', this.cutId()).subscribe({
        next: (cut) => {
          this.cut.set(cut);
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

  protected commonest(column: CutView['profile']['columns'][number]): string {
    const byCount = column.values.toSorted((one, other) => other.count - one.count);
    return byCount
      .slice(0, 4)
      .map(({ value, count }) => `${shownCode(value)} (${count.toLocaleString('en')})`)
      .join(', ');
  }

  protected columnName(columnId: string | null): string {
    const columns = this.cut()?.profile.columns ?? [];
    return columns.find((column) => column.columnId === columnId)?.name ?? 'The file';
  }
}
