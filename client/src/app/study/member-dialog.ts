import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import { MAT_DIALOG_DATA } from '@angular/material/dialog';
import type { StudyView } from '#shared/api';
import { STUDY_ROLES, type StudyRole } from '#shared/permissions';
import { StudiesApi } from '../server-api/studies-api';
import { DialogFrame } from '../ui/dialog/dialog-frame';
import { FormDialog } from '../ui/dialog/form-dialog';
import { Field } from '../ui/field/field';
import { FieldControl } from '../ui/field/field-control';
import { FocusProblem } from '../ui/field/focus-problem';
import { ProblemPanel } from '../ui/status/problem-panel';
import { ROLE_WORDS } from '../ui/words';

const ADDRESS_WANTED = 'Give an e-mail address such as name@example.org.';

/** Address and role of a new member. */
@Component({
  selector: 'eh-member-dialog',
  imports: [DialogFrame, Field, FieldControl, FocusProblem, ProblemPanel, ReactiveFormsModule],
  templateUrl: './member-dialog.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MemberDialog {
  private readonly api = inject(StudiesApi);
  private readonly study = inject<StudyView>(MAT_DIALOG_DATA);

  protected readonly roles = STUDY_ROLES;
  protected readonly roleWords = ROLE_WORDS;
  protected readonly form = new FormGroup({
    email: new FormControl('', {
      nonNullable: true,
      validators: [Validators.required, Validators.email],
    }),
    role: new FormControl<StudyRole>('reader', { nonNullable: true }),
  });
  protected readonly dialog = new FormDialog<StudyView>(this.form, {
    email: { required: ADDRESS_WANTED, email: ADDRESS_WANTED },
  });

  protected save(): void {
    this.dialog.send(() => this.api.addMember(this.study.id, this.form.getRawValue()));
  }
}
