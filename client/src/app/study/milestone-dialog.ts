import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import { MAT_DIALOG_DATA } from '@angular/material/dialog';
import type { Milestone, StudyView } from '#shared/api';
import { StudiesApi } from '../server-api/studies-api';
import { DialogFrame } from '../ui/dialog/dialog-frame';
import { FormDialog } from '../ui/dialog/form-dialog';
import { Field } from '../ui/field/field';
import { FieldControl } from '../ui/field/field-control';
import { newId } from '../ui/new-id';
import { FocusProblem } from '../ui/field/focus-problem';
import { ProblemPanel } from '../ui/status/problem-panel';

/** A milestone to change, or null for a new one. */
export interface MilestoneToEdit {
  readonly studyId: string;
  readonly milestone: Milestone | null;
}

/** Title and day of a milestone. */
@Component({
  selector: 'eh-milestone-dialog',
  imports: [DialogFrame, Field, FieldControl, FocusProblem, ProblemPanel, ReactiveFormsModule],
  templateUrl: './milestone-dialog.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MilestoneDialog {
  private readonly api = inject(StudiesApi);
  protected readonly data = inject<MilestoneToEdit>(MAT_DIALOG_DATA);
  private readonly milestoneId = this.data.milestone?.id ?? newId();

  protected readonly form = new FormGroup({
    title: new FormControl(this.data.milestone?.title ?? '', {
      nonNullable: true,
      validators: [Validators.required],
    }),
    dueDate: new FormControl(this.data.milestone?.dueDate ?? '', {
      nonNullable: true,
      validators: [Validators.required],
    }),
  });
  protected readonly dialog = new FormDialog<StudyView>(this.form, {
    title: { required: 'Give the milestone a title.' },
    dueDate: { required: 'Give the day on which it is due.' },
  });

  protected save(): void {
    const milestone = { id: this.milestoneId, ...this.form.getRawValue() };
    this.dialog.send(() => this.api.putMilestone(this.data.studyId, milestone));
  }
}
