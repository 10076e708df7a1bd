import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import { MAT_DIALOG_DATA } from '@angular/material/dialog';
import type { ReportView } from '#shared/api';
import { catchError, of } from 'rxjs';
import { HouseStylesApi } from '../../server-api/house-styles-api';
import { ReportsApi } from '../../server-api/reports-api';
import { DialogFrame } from '../../ui/dialog/dialog-frame';
import { FormDialog } from '../../ui/dialog/form-dialog';
import { Field } from '../../ui/field/field';
import { FieldControl } from '../../ui/field/field-control';
import { ProblemPanel } from '../../ui/status/problem-panel';

/** The house style that a report starts with unless another one is chosen. */
const USUAL_STYLE = 'open-clinical';
const LONGEST_TITLE = 300;

/** Asks for the title and the house style of a new report. Closes with it. */
@Component({
  selector: 'eh-new-report-dialog',
  imports: [DialogFrame, Field, FieldControl, ProblemPanel, ReactiveFormsModule],
  template: `
    <eh-dialog-frame question="What is the report called?">
      <form id="new-report" [formGroup]="form" (ngSubmit)="create()">
        <eh-field label="Report name" [problem]="dialog.problems.of('title')">
          <input ehControl class="input" formControlName="title" />
        </eh-field>
        <eh-field
          label="House style"
          help="How numbers, tables and sentences are written. It can be changed later."
        >
          <select ehControl class="input" formControlName="houseStyleId">
            @for (style of styles(); track style.id) {
              <option [value]="style.id">{{ style.name }}</option>
            }
          </select>
        </eh-field>
        @if (dialog.problems.problem(); as problem) {
          <eh-problem-panel [problem]="problem" />
        }
      </form>
      <ng-container dialogActions>
        <button type="button" class="button" (click)="dialog.leave()">Begin none</button>
        <button type="submit" form="new-report" class="button primary" [disabled]="dialog.busy()">
          Begin the report
        </button>
      </ng-container>
    </eh-dialog-frame>
  `,
  styles: `
    form {
      display: grid;
      gap: 14px;
      padding-top: 4px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NewReportDialog {
  private readonly api = inject(ReportsApi);
  private readonly studyId = inject<string>(MAT_DIALOG_DATA);

  protected readonly styles = toSignal(
    inject(HouseStylesApi)
      .list()
      .pipe(catchError(() => of([]))),
    { initialValue: [] },
  );
  protected readonly form = new FormGroup({
    title: new FormControl('', {
      nonNullable: true,
      validators: [Validators.required, Validators.maxLength(LONGEST_TITLE)],
    }),
    houseStyleId: new FormControl(USUAL_STYLE, { nonNullable: true }),
  });
  protected readonly dialog = new FormDialog<ReportView>(this.form, {
    title: {
      required: 'Give the report a name.',
      maxlength: `A name has at most ${LONGEST_TITLE} characters.`,
    },
  });

  protected create(): void {
    this.dialog.send(() => this.api.create(this.studyId, this.form.getRawValue()));
  }
}
