import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  type OnInit,
  signal,
} from '@angular/core';
import { Router, RouterLink } from '@angular/router';
import type { ReportSummary, ReportView } from '#shared/api';
import { ApiProblem } from '../../server-api/api-problem';
import { ReportsApi } from '../../server-api/reports-api';
import { CurrentStudy } from '../../session/current-study';
import { Bar, BarActions } from '../../ui/bar/bar';
import { dateAndTime } from '../../ui/dates';
import { Dialogs } from '../../ui/dialog/dialogs';
import { EmptyState } from '../../ui/status/empty-state';
import { ProblemPanel } from '../../ui/status/problem-panel';
import { StageStamp } from '../../ui/status/stage-stamp';
import { counted } from '../../ui/words';
import { NewReportDialog } from './new-report-dialog';

/** The reports of a study. */
@Component({
  selector: 'eh-report-list-page',
  imports: [Bar, BarActions, EmptyState, ProblemPanel, RouterLink, StageStamp],
  templateUrl: './report-list-page.html',
  styleUrl: './report-list-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ReportListPage implements OnInit {
  private readonly api = inject(ReportsApi);
  private readonly study = inject(CurrentStudy);
  private readonly dialogs = inject(Dialogs);
  private readonly router = inject(Router);

  readonly studyId = input.required<string>();

  protected readonly reports = signal<readonly ReportSummary[] | null>(null);
  protected readonly problem = signal<ApiProblem | null>(null);
  protected readonly studyTitle = computed(() => this.study.study()?.title ?? '');
  protected readonly mayCreate = computed(() => this.study.may('editWordsBlocks'));

  ngOnInit(): void {
    this.api.list(this.studyId()).subscribe({
      next: (reports) => {
        this.reports.set(reports);
      },
      error: (failure: unknown) => {
        this.problem.set(ApiProblem.from(failure));
      },
    });
  }

  protected create(): void {
    this.dialogs.open<ReportView>(NewReportDialog, this.studyId()).subscribe(({ report }) => {
      void this.router.navigate(['/studies', this.studyId(), 'reports', report.id]);
    });
  }

  protected changed({ updatedAt, updatedBy }: ReportSummary): string {
    const when = dateAndTime(updatedAt);
    return updatedBy === null ? when : `${when}, ${updatedBy}`;
  }

  protected blocks({ blockCount }: ReportSummary): string {
    return counted(blockCount, 'block', 'blocks');
  }
}
