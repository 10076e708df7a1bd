import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import { MAT_DIALOG_DATA } from '@angular/material/dialog';
import { Router } from '@angular/router';
import type { ReportSummary } from '#shared/api';
import { type Observable, switchMap, tap } from 'rxjs';
import { ReportsApi } from '../../server-api/reports-api';
import { CurrentStudy } from '../../session/current-study';
import { DialogFrame } from '../../ui/dialog/dialog-frame';
import { FormDialog } from '../../ui/dialog/form-dialog';
import { Field } from '../../ui/field/field';
import { FieldControl } from '../../ui/field/field-control';
import { Notices } from '../../ui/notices/notices';
import { ProblemPanel } from '../../ui/status/problem-panel';
import { insertionSteps, type UsedAnalysis } from './insertion-steps';

const NEW_REPORT = '';

/** Puts a table, a figure and a sentence of an analysis at the end of a report, and goes there. */
@Component({
  selector: 'eh-use-in-report-dialog',
  imports: [DialogFrame, Field, FieldControl, ProblemPanel, ReactiveFormsModule],
  templateUrl: './use-in-report-dialog.html',
  styleUrl: './use-in-report-dialog.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class UseInReportDialog {
  protected readonly used = inject<UsedAnalysis>(MAT_DIALOG_DATA);
  private readonly api = inject(ReportsApi);
  private readonly router = inject(Router);
  private readonly notices = inject(Notices);
  private readonly studyId = inject(CurrentStudy).study()?.id ?? '';

  protected readonly form = new FormGroup({
    reportId: new FormControl(NEW_REPORT, { nonNullable: true }),
    title: new FormControl('', { nonNullable: true }),
    table: new FormControl(true, { nonNullable: true }),
    figure: new FormControl(true, { nonNullable: true }),
    sentence: new FormControl(true, { nonNullable: true }),
  });
  protected readonly reports = toSignal<readonly ReportSummary[], readonly ReportSummary[]>(
    this.api.list(this.studyId).pipe(
      tap((reports) => {
        this.choose(reports);
      }),
    ),
    { initialValue: [] },
  );
  protected readonly reportId = toSignal(this.form.controls.reportId.valueChanges, {
    initialValue: NEW_REPORT,
  });
  protected readonly dialog = new FormDialog<string>(this.form, {
    title: { required: 'Give the report a title.' },
  });

  protected use(): void {
    this.requireTitleOfNew();
    this.dialog.send(() =>
      this.report().pipe(
        switchMap((reportId) => this.insert(reportId)),
        tap((reportId) => {
          this.notices.say(`${this.used.analysis.number} is at the end of the report.`);
          void this.router.navigate(['/studies', this.studyId, 'reports', reportId]);
        }),
      ),
    );
  }

  private choose(reports: readonly ReportSummary[]): void {
    const newest = reports.toSorted((one, other) => (one.updatedAt < other.updatedAt ? 1 : -1))[0];
    if (newest !== undefined) this.form.controls.reportId.setValue(newest.id);
  }

  private requireTitleOfNew(): void {
    const { reportId, title } = this.form.controls;
    title.setValidators(reportId.value === NEW_REPORT ? [Validators.required] : []);
    title.updateValueAndValidity();
  }

  /** Id of the report that was chosen, or of the new one. */
  private report(): Observable<string> {
    const { reportId, title } = this.form.getRawValue();
    const opened =
      reportId === NEW_REPORT
        ? this.api.create(this.studyId, { title, houseStyleId: 'open-clinical' })
        : this.api.read(this.studyId, reportId);
    return opened.pipe(
      tap(({ report }) => {
        // A second try must not begin another report.
        this.form.controls.reportId.setValue(report.id);
      }),
      switchMap(({ report }) => [report.id]),
    );
  }

  private insert(reportId: string): Observable<string> {
    return this.api.read(this.studyId, reportId).pipe(
      switchMap(({ report }) => {
        const steps = insertionSteps(report, this.used, this.form.getRawValue());
        return this.api.submitSteps(this.studyId, reportId, { steps });
      }),
      switchMap(() => [reportId]),
    );
  }
}
