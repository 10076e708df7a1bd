import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { ReactiveFormsModule } from '@angular/forms';
import { MAT_DIALOG_DATA } from '@angular/material/dialog';
import { checkOutsideEstimate } from '#shared/outside-estimates';
import type {
  OutsideEstimate,
  OutsideEstimateEntry,
  OutsideFinding,
} from '#shared/outside-estimates';
import { outsideMeasureName } from '#shared/wording';
import { map } from 'rxjs';
import { type EstimatePlace, OutsideEstimatesApi } from '../../server-api/outside-estimates-api';
import { DialogFrame } from '../../ui/dialog/dialog-frame';
import { FormDialog } from '../../ui/dialog/form-dialog';
import { Field } from '../../ui/field/field';
import { FieldControl } from '../../ui/field/field-control';
import { FocusProblem } from '../../ui/field/focus-problem';
import { MarginNote } from '../../ui/status/margin-note';
import { ProblemPanel } from '../../ui/status/problem-panel';
import { levelLabel } from '../bench/result-scopes';
import { ESTIMATE_MESSAGES, entryIn, estimateForm, MEASURES } from './estimate-form';
import { findingNotes, type OutsidePrint } from './outside-rows';

/** Where an estimate goes, what it stands beside, and the one that is changed. */
export interface EstimateRequest {
  readonly place: EstimatePlace;
  readonly print: OutsidePrint;
  readonly estimate: OutsideEstimate | null;
}

/** The form of an estimate from elsewhere; what the checks find stands below as it is typed. */
@Component({
  selector: 'eh-estimate-dialog',
  imports: [
    DialogFrame,
    Field,
    FieldControl,
    FocusProblem,
    MarginNote,
    ProblemPanel,
    ReactiveFormsModule,
  ],
  templateUrl: './estimate-dialog.html',
  styleUrl: './estimate-dialog.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class EstimateDialog {
  protected readonly request = inject<EstimateRequest>(MAT_DIALOG_DATA);
  private readonly api = inject(OutsideEstimatesApi);
  private readonly result = this.request.print.result;
  private readonly exposure = this.result.frame.exposure;

  protected readonly levels = this.exposure.levels.filter(
    ({ id }) => id !== this.exposure.referenceLevelId,
  );
  protected readonly against = levelLabel(this.result, this.exposure.referenceLevelId);
  protected readonly measures = MEASURES.map((id) => ({
    id,
    name: outsideMeasureName(id, this.request.print, this.request.print.book),
  }));
  protected readonly form = estimateForm(this.request.estimate, {
    levelId: this.levels.at(-1)?.id ?? '',
    level: this.result.specification.level,
    measure: 'oddsRatio',
  });
  protected readonly dialog = new FormDialog<OutsideEstimate>(this.form, ESTIMATE_MESSAGES);
  private readonly entry = toSignal(this.form.valueChanges.pipe(map(() => this.read())), {
    initialValue: this.read(),
  });

  protected readonly inPoints = computed(() => this.entry().measure === 'riskDifference');
  protected readonly notes = computed(() => {
    const findings = checkOutsideEstimate(this.entry(), this.result).filter(isAboutTyped);
    return findingNotes(findings, this.request.print);
  });

  protected save(): void {
    const { place, estimate } = this.request;
    const entry = { ...this.read(), covariates: [...this.read().covariates] };
    this.dialog.send(() =>
      estimate === null
        ? this.api.add(place, entry)
        : this.api.change(place, estimate.id, { ...entry, baseVersion: estimate.version }),
    );
  }

  private read(): OutsideEstimateEntry {
    return entryIn(this.form, this.exposure.referenceLevelId);
  }
}

/** A field that is still empty is no finding. */
function isAboutTyped({ id, facts }: OutsideFinding): boolean {
  return id !== 'numberNotReadable' || facts.text !== '';
}
