import { inject, Injectable } from '@angular/core';
import type { BoundValueFormat } from '#shared/report/text';
import type { Observable } from 'rxjs';
import { CurrentStudy } from '../../session/current-study';
import { Dialogs } from '../../ui/dialog/dialogs';
import { AnalysisPicker } from '../block-actions/analysis-picker';
import { ProofWords } from '../proof/proof-words';
import { ReportState } from '../report-store/report-state';
import { ValuePickerDialog, type ValuePickerRequest } from './value-picker-dialog';

/** A value that was chosen, and how it prints. */
export interface PickedValue {
  readonly address: string;
  readonly format: BoundValueFormat;
}

/** Lets a person choose among every value of every analysis. */
@Injectable()
export class ValuePicker {
  private readonly dialogs = inject(Dialogs);
  private readonly state = inject(ReportState);
  private readonly words = inject(ProofWords);
  private readonly analyses = inject(AnalysisPicker);
  private readonly study = inject(CurrentStudy);

  /** The chosen value; nothing when the list was left. `at` is the value to begin with. */
  pick(at: string | null): Observable<PickedValue> {
    const request: ValuePickerRequest = {
      at,
      studyId: this.study.study()?.id ?? '',
      pins: this.state.pins,
      words: this.words,
      offer: (analysisId) => {
        this.analyses.read(analysisId).subscribe((pin) => {
          this.state.offer(pin);
        });
      },
    };
    return this.dialogs.open<PickedValue>(ValuePickerDialog, request);
  }
}
