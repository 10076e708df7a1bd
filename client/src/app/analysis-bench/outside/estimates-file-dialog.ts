import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { MAT_DIALOG_DATA, MatDialogRef } from '@angular/material/dialog';
import type { OutsideEstimate } from '#shared/outside-estimates';
import { ApiProblem } from '../../server-api/api-problem';
import { type EstimatePlace, OutsideEstimatesApi } from '../../server-api/outside-estimates-api';
import { DialogFrame } from '../../ui/dialog/dialog-frame';
import { Field } from '../../ui/field/field';
import { FieldControl } from '../../ui/field/field-control';
import { ProblemPanel } from '../../ui/status/problem-panel';

/** Takes the estimates of a CSV file over, all or none; says line by line what is wrong. */
@Component({
  selector: 'eh-estimates-file-dialog',
  imports: [DialogFrame, Field, FieldControl, ProblemPanel],
  templateUrl: './estimates-file-dialog.html',
  styleUrl: './estimate-dialog.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class EstimatesFileDialog {
  private readonly place = inject<EstimatePlace>(MAT_DIALOG_DATA);
  private readonly reference =
    inject<MatDialogRef<EstimatesFileDialog, OutsideEstimate[]>>(MatDialogRef);
  private readonly api = inject(OutsideEstimatesApi);

  protected readonly busy = signal(false);
  protected readonly problem = signal<ApiProblem | null>(null);

  protected choose(event: Event): void {
    const input = event.target as HTMLInputElement;
    const file = input.files?.[0];
    if (file === undefined || this.busy()) return;
    this.busy.set(true);
    this.problem.set(null);
    this.api.load(this.place, file).subscribe({
      next: (estimates) => {
        this.reference.close(estimates);
      },
      error: (failure: unknown) => {
        this.busy.set(false);
        // The corrected file often has the same name, and must count as chosen again.
        input.value = '';
        this.problem.set(ApiProblem.from(failure));
      },
    });
  }

  protected leave(): void {
    this.reference.close();
  }
}
