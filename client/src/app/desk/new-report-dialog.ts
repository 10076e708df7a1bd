import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import { MAT_DIALOG_DATA } from '@angular/material/dialog';
import type { ReportView, StudyView } from '#shared/api';
import { tap } from 'rxjs';
import { HouseStylesApi } from '../server-api/house-styles-api';
import { ReportsApi } from '../server-api/reports-api';
import { DialogFrame } from '../ui/dialog/dialog-frame';
import { FormDialog } from '../ui/dialog/form-dialog';
import { Field } from '../ui/field/field';
import { FieldControl } from '../ui/field/field-control';
import { FocusProblem } from '../ui/field/focus-problem';
import { ProblemPanel } from '../ui/status/problem-panel';

/** Study, title and house style of a new report. */
@Component({
  selector: 'eh-new-report-dialog',
  imports: [DialogFrame, Field, FieldControl, FocusProblem, ProblemPanel, ReactiveFormsModule],
  templateUrl: './new-report-dialog.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NewReportDialog {
  private readonly reports = inject(ReportsApi);
  protected readonly studies = inject<readonly StudyView[]>(MAT_DIALOG_DATA);
  protected readonly form = new FormGroup({
    studyId: new FormControl(this.studies[0]?.id ?? '', { nonNullable: true }),
    title: new FormControl('', { nonNullable: true, validators: [Validators.required] }),
    houseStyleId: new FormControl('', { nonNullable: true, validators: [Validators.required] }),
  });
  protected readonly houseStyles = toSignal(
    inject(HouseStylesApi)
      .list()
      .pipe(
        tap((styles) => {
          this.form.patchValue({ houseStyleId: styles[0]?.id ?? '' });
        }),
      ),
    { initialValue: [] },
  );
  protected readonly dialog = new FormDialog<ReportView>(this.form, {
    title: { required: 'Give the report a title.' },
    houseStyleId: { required: 'Choose a house style.' },
  });

  protected save(): void {
    this.dialog.send(() => {
      const { studyId, ...request } = this.form.getRawValue();
      return this.reports.create(studyId, request);
    });
  }
}
