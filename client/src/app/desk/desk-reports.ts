import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { ReportSummary } from '#shared/api';
import { dateAndTime } from '../ui/dates';
import { StageStamp } from '../ui/status/stage-stamp';
import { counted } from '../ui/words';
import { ReportSketch } from './report-sketch';

const MOST = 3;

/** The reports that were changed last, as pages from afar. */
@Component({
  selector: 'eh-desk-reports',
  imports: [ReportSketch, RouterLink, StageStamp],
  template: `
    <h2>Reports you work on</h2>
    <div class="reports">
      @for (report of shown(); track report.id) {
        <a [routerLink]="['/studies', report.studyId, 'reports', report.id]">
          <eh-report-sketch [blockKinds]="report.blockKinds" />
          <b>{{ report.title }}</b>
          <eh-stage-stamp [stage]="report.stage" [small]="true" />
          <small>{{ counted(report.blockCount, 'block', 'blocks') }}</small>
          <small>Changed {{ dateAndTime(report.updatedAt) }}</small>
        </a>
      } @empty {
        <p class="second">None yet.</p>
      }
    </div>
  `,
  styleUrl: './desk-reports.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DeskReports {
  readonly reports = input.required<readonly ReportSummary[]>();

  protected readonly shown = computed(() => this.reports().slice(0, MOST));
  protected readonly counted = counted;
  protected readonly dateAndTime = dateAndTime;
}
