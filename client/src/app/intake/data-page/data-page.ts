import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { RouterLink } from '@angular/router';
import type { DataSetView } from '#shared/api';
import { ApiProblem } from '../../server-api/api-problem';
import { DataApi } from '../../server-api/data-api';
import { CurrentStudy } from '../../session/current-study';
import { Bar, BarActions } from '../../ui/bar/bar';
import { Confirm } from '../../ui/dialog/confirm';
import { dateAndTime, shortDate } from '../../ui/dates';
import { ScrollSideways } from '../../ui/scroll-sideways';
import { EmptyState } from '../../ui/status/empty-state';
import { ProblemPanel } from '../../ui/status/problem-panel';
import { type UnfinishedCut, UnfinishedCuts } from '../unfinished-cuts';
import { GroupedNumberPipe } from '../../ui/grouped-number-pipe';

/** The data sets of a study with their cuts. */
@Component({
  selector: 'eh-data-page',
  imports: [
    Bar,
    BarActions,
    GroupedNumberPipe,
    EmptyState,
    ProblemPanel,
    RouterLink,
    ScrollSideways,
  ],
  templateUrl: './data-page.html',
  styleUrl: './data-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DataPage {
  private readonly api = inject(DataApi);
  private readonly current = inject(CurrentStudy);
  private readonly unfinishedCuts = inject(UnfinishedCuts);
  private readonly confirm = inject(Confirm);

  protected readonly date = shortDate;
  protected readonly moment = dateAndTime;
  protected readonly study = this.current.study;
  protected readonly dataSets = signal<readonly DataSetView[] | null>(null);
  protected readonly problem = signal<ApiProblem | null>(null);
  protected readonly mayEdit = computed(() => this.current.may('editData'));
  protected readonly home = computed(() => ['/studies', this.study()?.id ?? '']);
  protected readonly unfinished = computed(() =>
    this.mayEdit() ? this.unfinishedCuts.of(this.study()?.id ?? '') : [],
  );

  constructor() {
    this.api
      .listDataSets(this.study()?.id ?? '')
      .pipe(takeUntilDestroyed())
      .subscribe({
        next: (dataSets) => {
          this.dataSets.set(dataSets);
        },
        error: (failure: unknown) => {
          this.problem.set(ApiProblem.from(failure));
        },
      });
  }

  protected newestFirst(dataSet: DataSetView): DataSetView['cuts'] {
    return dataSet.cuts.toSorted((one, other) => other.number - one.number);
  }

  protected discard(cut: UnfinishedCut): void {
    this.confirm
      .ask({
        question: `Discard the upload of ${cut.fileName}?`,
        consequence: 'The file and what was settled about it go. No cut was made of it.',
        keep: 'Keep it',
        act: 'Discard it',
      })
      .subscribe((acted) => {
        if (acted) this.drop(cut);
      });
  }

  /** An upload that the server has swept already is gone as well. */
  private drop(cut: UnfinishedCut): void {
    const forget = (): void => {
      this.unfinishedCuts.forget(cut.uploadId);
    };
    this.api.discardUpload(cut.studyId, cut.uploadId).subscribe({ next: forget, error: forget });
  }
}
