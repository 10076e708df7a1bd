import { computed, inject, Injectable } from '@angular/core';
import { Router } from '@angular/router';
import type { ReportView, StudyView } from '#shared/api';
import { mayDo } from '#shared/permissions';
import { Dialogs } from '../ui/dialog/dialogs';
import { DeskStore } from './desk-store';

/** Begins studies and reports; the code of the dialogs is loaded when it is wanted. */
@Injectable()
export class DeskDialogs {
  private readonly router = inject(Router);
  private readonly dialogs = inject(Dialogs);
  private readonly desk = inject(DeskStore);

  /** The studies on which this person may begin a report. */
  readonly reportPlaces = computed(() =>
    this.desk
      .shelf()
      .map(({ study }) => study)
      .filter(({ role }) => mayDo(role, 'editWordsBlocks')),
  );

  beginStudy(): void {
    void this.askForStudy();
  }

  beginReport(): void {
    void this.askForReport();
  }

  private async askForStudy(): Promise<void> {
    const { StudyDetailsDialog } = await import('../ui/study-details/study-details-dialog');
    this.dialogs.open<StudyView>(StudyDetailsDialog).subscribe((study) => {
      void this.router.navigate(['/studies', study.id]);
    });
  }

  private async askForReport(): Promise<void> {
    const { NewReportDialog } = await import('./new-report-dialog');
    this.dialogs.open<ReportView>(NewReportDialog, this.reportPlaces()).subscribe(({ report }) => {
      void this.router.navigate(['/studies', report.studyId, 'reports', report.id]);
    });
  }
}
