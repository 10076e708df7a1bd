import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import { MAT_DIALOG_DATA } from '@angular/material/dialog';
import type { StudyView } from '#shared/api';
import type { OutcomeWords } from '#shared/analysis';
import { map, startWith } from 'rxjs';
import { StudiesApi } from '../server-api/studies-api';
import { DialogFrame } from '../ui/dialog/dialog-frame';
import { FormDialog } from '../ui/dialog/form-dialog';
import { Field } from '../ui/field/field';
import { FieldControl } from '../ui/field/field-control';
import { newId } from '../ui/new-id';
import { FocusProblem } from '../ui/field/focus-problem';
import { ProblemPanel } from '../ui/status/problem-panel';
import { outcomeReads } from './outcome-reads';

/** An outcome to word again, or null for a new one. */
export interface OutcomeToEdit {
  readonly study: StudyView;
  readonly outcome: OutcomeWords | null;
}

const MESSAGES = {
  noun: { required: 'Name the outcome, as in “hand eczema”.' },
  verbPhrase: { required: 'Say what happened to people, as in “developed hand eczema”.' },
};

/** The words of an outcome, with the sentence that they will make. */
@Component({
  selector: 'eh-outcome-dialog',
  imports: [DialogFrame, Field, FieldControl, FocusProblem, ProblemPanel, ReactiveFormsModule],
  templateUrl: './outcome-dialog.html',
  styleUrl: './outcome-dialog.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class OutcomeDialog {
  private readonly api = inject(StudiesApi);
  protected readonly data = inject<OutcomeToEdit>(MAT_DIALOG_DATA);
  private readonly outcomeId = this.data.outcome?.id ?? newId();

  protected readonly form = new FormGroup({
    noun: required(this.data.outcome?.noun ?? ''),
    verbPhrase: required(this.data.outcome?.verbPhrase ?? ''),
    timeFrame: new FormControl(this.data.outcome?.timeFrame ?? '', { nonNullable: true }),
    desirability: new FormControl<OutcomeWords['desirability']>(
      this.data.outcome?.desirability ?? 'harmful',
      { nonNullable: true },
    ),
  });
  protected readonly dialog = new FormDialog<StudyView>(this.form, MESSAGES);
  protected readonly reads = toSignal(
    this.form.valueChanges.pipe(
      startWith(null),
      map(() => outcomeReads(this.typed(), this.data.study.peopleNoun)),
    ),
    { requireSync: true },
  );

  protected save(): void {
    this.dialog.send(() => this.api.putOutcome(this.data.study.id, this.typed()));
  }

  private typed(): OutcomeWords {
    const { timeFrame, ...words } = this.form.getRawValue();
    const given = timeFrame.trim();
    return { id: this.outcomeId, ...words, timeFrame: given === '' ? null : given };
  }
}

function required(value: string): FormControl<string> {
  return new FormControl(value, { nonNullable: true, validators: [Validators.required] });
}
