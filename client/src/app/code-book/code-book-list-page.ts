import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { Router, RouterLink } from '@angular/router';
import type { DataSetView } from '#shared/api';
import { ApiProblem } from '../server-api/api-problem';
import { DataApi } from '../server-api/data-api';
import { CurrentStudy } from '../session/current-study';
import { Bar } from '../ui/bar/bar';
import { EmptyState } from '../ui/status/empty-state';
import { ProblemPanel } from '../ui/status/problem-panel';
import { counted } from '../ui/words';

/** The code books of a study; with one data set it leads straight to its own. */
@Component({
  selector: 'eh-code-book-list-page',
  imports: [Bar, EmptyState, ProblemPanel, RouterLink],
  template: `
    <eh-bar heading="Code books" [contextText]="study()?.title ?? ''" [contextLink]="home()" />
    <div class="page">
      @if (problem(); as problem) {
        <eh-problem-panel [problem]="problem" />
      }
      @if (dataSets(); as dataSets) {
        @if (dataSets.length === 0) {
          <eh-empty-state fact="No code book yet">
            It comes with the first data. <a [routerLink]="[...home(), 'data']">Go to the data</a>
          </eh-empty-state>
        } @else {
          <ul class="panel">
            @for (dataSet of dataSets; track dataSet.id) {
              <li>
                <a [routerLink]="[...home(), 'code-book', dataSet.id]">{{ dataSet.name }}</a>
                <span class="second">
                  Code book {{ dataSet.codeBookNumber }}, {{ cuts(dataSet.cuts.length) }}
                </span>
              </li>
            }
          </ul>
        }
      }
    </div>
  `,
  styles: `
    .page {
      display: grid;
      gap: 16px;
      max-width: 760px;
      padding: 16px 20px 36px;
    }
    li {
      display: flex;
      flex-wrap: wrap;
      gap: 4px 16px;
      justify-content: space-between;
      padding: 12px 18px;
    }
    li + li {
      border-top: 1px solid var(--line);
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CodeBookListPage {
  private readonly router = inject(Router);
  protected readonly study = inject(CurrentStudy).study;
  protected readonly home = computed(() => ['/studies', this.study()?.id ?? '']);
  protected readonly dataSets = signal<readonly DataSetView[] | null>(null);
  protected readonly problem = signal<ApiProblem | null>(null);

  constructor() {
    inject(DataApi)
      .listDataSets(this.study()?.id ?? '')
      .pipe(takeUntilDestroyed())
      .subscribe({
        next: (dataSets) => {
          this.show(dataSets);
        },
        error: (failure: unknown) => {
          this.problem.set(ApiProblem.from(failure));
        },
      });
  }

  protected cuts(count: number): string {
    return counted(count, 'cut', 'cuts');
  }

  private show(dataSets: readonly DataSetView[]): void {
    const [only] = dataSets;
    if (dataSets.length === 1 && only !== undefined) {
      void this.router.navigate([...this.home(), 'code-book', only.id], { replaceUrl: true });
    } else {
      this.dataSets.set(dataSets);
    }
  }
}
