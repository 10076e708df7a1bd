import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import type { OutsideEstimate } from '#shared/outside-estimates';
import { Dialogs } from '../../ui/dialog/dialogs';
import { ScrollSideways } from '../../ui/scroll-sideways';
import { MarginNote } from '../../ui/status/margin-note';
import { BenchStore } from '../bench/bench-store';
import { levelLabel } from '../bench/result-scopes';
import type { EstimateRequest } from './estimate-dialog';
import { OutsideStore } from './outside-store';

/** Adjusted estimates that models outside computed, beside the crude numbers of the analysis. */
@Component({
  selector: 'eh-outside-panel',
  imports: [MarginNote, ScrollSideways],
  providers: [OutsideStore],
  templateUrl: './outside-panel.html',
  styleUrl: './outside-panel.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class OutsidePanel {
  protected readonly bench = inject(BenchStore);
  protected readonly store = inject(OutsideStore);
  private readonly dialogs = inject(Dialogs);

  protected readonly against = computed(() => {
    const result = this.store.print()?.result;
    return result === undefined ? '' : levelLabel(result, result.frame.exposure.referenceLevelId);
  });

  /** Opens the form, empty or with an estimate that is changed. */
  protected async enter(estimate: OutsideEstimate | null): Promise<void> {
    const [place, print] = [this.store.place(), this.store.print()];
    if (place === null || print === null) return;
    const { EstimateDialog } = await import('./estimate-dialog');
    const request: EstimateRequest = { place, print, estimate };
    this.dialogs.open<OutsideEstimate>(EstimateDialog, request).subscribe((entered) => {
      this.store.take(entered);
    });
  }

  protected async load(): Promise<void> {
    const place = this.store.place();
    if (place === null) return;
    const { EstimatesFileDialog } = await import('./estimates-file-dialog');
    this.dialogs.open<OutsideEstimate[]>(EstimatesFileDialog, place).subscribe((loaded) => {
      loaded.forEach((estimate) => {
        this.store.take(estimate);
      });
    });
  }
}
