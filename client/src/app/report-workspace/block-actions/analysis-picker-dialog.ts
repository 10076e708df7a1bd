import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MAT_DIALOG_DATA, MatDialogRef } from '@angular/material/dialog';
import type { AnalysisSummary } from '#shared/api';
import { DialogFrame } from '../../ui/dialog/dialog-frame';

/** The analyses of the study to choose from. Closes with the id of one. */
@Component({
  selector: 'eh-analysis-picker-dialog',
  imports: [DialogFrame],
  template: `
    <eh-dialog-frame question="Which analysis?">
      <ul>
        @for (analysis of analyses; track analysis.id) {
          <li>
            <button type="button" (click)="choose(analysis.id)">
              <b>{{ analysis.number }}</b>
              <span>
                {{ analysis.name }}
                <small>{{ analysis.dataSetName }}, cut {{ analysis.cutNumber }}</small>
              </span>
            </button>
          </li>
        }
      </ul>
      <button dialogActions type="button" class="button" (click)="leave()">Add no block</button>
    </eh-dialog-frame>
  `,
  styleUrl: './analysis-picker-dialog.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AnalysisPickerDialog {
  protected readonly analyses = inject<readonly AnalysisSummary[]>(MAT_DIALOG_DATA);
  private readonly reference = inject<MatDialogRef<AnalysisPickerDialog, string>>(MatDialogRef);

  protected choose(analysisId: string): void {
    this.reference.close(analysisId);
  }

  protected leave(): void {
    this.reference.close();
  }
}
