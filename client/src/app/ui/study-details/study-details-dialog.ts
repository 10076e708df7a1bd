import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import { MAT_DIALOG_DATA } from '@angular/material/dialog';
import type { StudyView } from '#shared/api';
import { STUDY_DESIGNS, type StudyDesign } from '#shared/effects/study-design';
import { StudiesApi } from '../../server-api/studies-api';
import { DialogFrame } from '../dialog/dialog-frame';
import { FormDialog } from '../dialog/form-dialog';
import { Field } from '../field/field';
import { FieldControl } from '../field/field-control';
import { FocusProblem } from '../field/focus-problem';
import { ProblemPanel } from '../status/problem-panel';
import { DESIGN_WORDS } from '../words';

const MESSAGES = {
  title: { required: 'Give the study a title.' },
  peopleNoun: { required: 'Say who the records are, as in “workers”.' },
};

/** Title, design and people of a study: a new one (data null), or one that is there. */
@Component({
  selector: 'eh-study-details-dialog',
  imports: [DialogFrame, Field, FieldControl, FocusProblem, ProblemPanel, ReactiveFormsModule],
  templateUrl: './study-details-dialog.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StudyDetailsDialog {
  private readonly api = inject(StudiesApi);
  protected readonly study = inject<StudyView | null>(MAT_DIALOG_DATA);

  protected readonly designs = STUDY_DESIGNS;
  protected readonly designWords = DESIGN_WORDS;
  protected readonly form = new FormGroup({
    title: required(this.study?.title ?? ''),
    design: new FormControl<StudyDesign>(this.study?.design ?? 'cohort', { nonNullable: true }),
    population: new FormControl(this.study?.population ?? '', { nonNullable: true }),
    peopleNoun: required(this.study?.peopleNoun ?? ''),
  });
  protected readonly dialog = new FormDialog<StudyView>(this.form, MESSAGES);

  protected save(): void {
    this.dialog.send(() => {
      const request = this.form.getRawValue();
      return this.study === null
        ? this.api.create(request)
        : this.api.change(this.study.id, request);
    });
  }
}

function required(value: string): FormControl<string> {
  return new FormControl(value, { nonNullable: true, validators: [Validators.required] });
}
