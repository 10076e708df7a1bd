import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { RouterLink } from '@angular/router';
import type { AnalysisSummary } from '#shared/api';
import { AnalysesApi } from '../server-api/analyses-api';
import { ApiProblem } from '../server-api/api-problem';
import { CurrentStudy } from '../session/current-study';
import { Bar, BarActions } from '../ui/bar/bar';
import { shortDate } from '../ui/dates';
import { ScrollSideways } from '../ui/scroll-sideways';
import { EmptyState } from '../ui/status/empty-state';
import { ProblemPanel } from '../ui/status/problem-panel';
import { counted } from '../ui/words';

/** The analyses of a study. */
@Component({
  selector: 'eh-analyses-page',
  imports: [Bar, BarActions, EmptyState, ProblemPanel, RouterLink, ScrollSideways],
  templateUrl: './analyses-page.html',
  styleUrl: './analyses-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AnalysesPage {
  private readonly current = inject(CurrentStudy);

  protected readonly study = this.current.study;
  protected readonly mayEdit = computed(() => this.current.may('editData'));
  protected readonly home = computed(() => ['/studies', this.study()?.id ?? '']);
  protected readonly analyses = signal<readonly AnalysisSummary[] | null>(null);
  protected readonly problem = signal<ApiProblem | null>(null);
  protected readonly date = shortDate;

  constructor() {
    inject(AnalysesApi)
      .list(this.study()?.id ?? '')
      .pipe(takeUntilDestroyed())
      .subscribe({
        next: (analyses) => {
          this.analyses.set(analyses);
        },
        error: (failure: unknown) => {
          this.problem.set(ApiProblem.from(failure));
        },
      });
  }

  protected blocks(count: number): string {
    return counted(count, 'block', 'blocks');
  }
}
