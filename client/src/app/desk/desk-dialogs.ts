import { computed, inject, Injectable, Injector } from '@angular/core';
import { Router } from '@angular/router';
import type { ReportView, StudyView } from '#shared/api';
import { mayDo } from '#shared/permissions';
import type { Dialogs } from '../ui/dialog/dialogs';
import { DeskStore } from './desk-store';

/** Begins studies and reports; the code of the dialogs is loaded when it is wanted. */
@Injectable()
export class DeskDialogs {
  private readonly router = inject(Router);
  private readonly injector = inject(Injector);
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
    const dialogs = await this.dialogs();
    dialogs.open<StudyView>(StudyDetailsDialog).subscribe((study) => {
      void this.router.navigate(['/studies', study.id]);
    });
  }

  private async askForReport(): Promise<void> {
    const { NewReportDialog } = await import('./new-report-dialog');
    const dialogs = await this.dialogs();
    dialogs.open<ReportView>(NewReportDialog, this.reportPlaces()).subscribe(({ report }) => {
      void this.router.navigate(['/studies', report.studyId, 'reports', report.id]);
    });
  }

  private async dialogs(): Promise<Dialogs> {
    const { Dialogs } = await import('../ui/dialog/dialogs');
    return this.injector.get(Dialogs);
  }
}
