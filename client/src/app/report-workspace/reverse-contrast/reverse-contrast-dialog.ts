import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MAT_DIALOG_DATA } from '@angular/material/dialog';
import { FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import { toSignal } from '@angular/core/rxjs-interop';
import { reverseContrast } from '#shared/analysis';
import type { AnalysisView } from '#shared/api';
import type { PinnedAnalysis } from '#shared/report';
import { mergeMap, type Observable } from 'rxjs';
import { AnalysesApi } from '../../server-api/analyses-api';
import { DialogFrame } from '../../ui/dialog/dialog-frame';
import { FormDialog } from '../../ui/dialog/form-dialog';
import { Field } from '../../ui/field/field';
import { FieldControl } from '../../ui/field/field-control';
import { ProblemPanel } from '../../ui/status/problem-panel';

/** The analysis to turn round, and the level to begin with. */
export interface ReverseRequest {
  readonly studyId: string;
  readonly pin: PinnedAnalysis;
  readonly levelId: string | null;
}

/** Asks for the new reference and the reason, and saves the analysis. Closes with it. */
@Component({
  selector: 'eh-reverse-contrast-dialog',
  imports: [DialogFrame, Field, FieldControl, ProblemPanel, ReactiveFormsModule],
  templateUrl: './reverse-contrast-dialog.html',
  styles: `
    form {
      display: grid;
      gap: 14px;
      padding-top: 10px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ReverseContrastDialog {
  private readonly api = inject(AnalysesApi);
  protected readonly request = inject<ReverseRequest>(MAT_DIALOG_DATA);

  private readonly exposure = this.request.pin.result.frame.exposure;
  protected readonly levels = this.exposure.levels.filter(
    ({ id }) => id !== this.exposure.referenceLevelId,
  );
  protected readonly form = new FormGroup({
    level: new FormControl(this.request.levelId ?? this.levels.at(-1)?.id ?? '', {
      nonNullable: true,
    }),
    reason: new FormControl('', { nonNullable: true, validators: [Validators.required] }),
  });
  protected readonly dialog = new FormDialog<AnalysisView>(this.form, {
    reason: { required: 'Say why: it is printed with the methods.' },
  });
  protected readonly question = `Reverse the contrast of ${this.request.pin.number}?`;
  private readonly chosen = toSignal(this.form.controls.level.valueChanges, {
    initialValue: this.form.controls.level.value,
  });
  protected readonly before = this.labelOf(this.exposure.referenceLevelId);
  protected readonly after = computed(() => this.labelOf(this.chosen()));

  protected save(): void {
    this.dialog.send(() => this.change());
  }

  private change(): Observable<AnalysisView> {
    const { studyId, pin } = this.request;
    const { level, reason } = this.form.getRawValue();
    return this.api.read(studyId, pin.analysisId).pipe(
      mergeMap(({ name, cutId, specification, version: baseVersion }) =>
        this.api.change(studyId, pin.analysisId, {
          name,
          cutId,
          specification: reverseContrast(specification, level),
          baseVersion,
          reason,
        }),
      ),
    );
  }

  private labelOf(levelId: string): string {
    return this.exposure.levels.find(({ id }) => id === levelId)?.label ?? levelId;
  }
}
