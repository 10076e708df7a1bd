import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { columnHeads, homogeneityWords } from '#shared/wording';
import { ScrollSideways } from '../../ui/scroll-sideways';
import { BenchStore } from '../bench/bench-store';
import { levelLabel, stratumLabel } from '../bench/result-scopes';
import { notEstimable, shownMeasures } from '../print/bench-print';
import { pooledRows } from '../print/pooled-rows';

/** The contrasts pooled over strata, and whether the strata differ. */
@Component({
  selector: 'eh-pooled-panel',
  imports: [ScrollSideways],
  templateUrl: './pooled-panel.html',
  styleUrl: './pooled-panel.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PooledPanel {
  protected readonly store = inject(BenchStore);

  protected readonly measures = computed(() => {
    const result = this.store.result();
    return result === null ? [] : shownMeasures(result);
  });
  protected readonly heads = computed(() => {
    const print = this.store.print();
    if (print === null) return null;
    return columnHeads({ analysisId: '', result: print.result }, print.style, print.book);
  });
  protected readonly rows = computed(() => {
    const print = this.store.print();
    return print === null ? [] : pooledRows(print, this.measures());
  });
  protected readonly over = computed(() => this.store.result()?.frame.strataLabel ?? '');
  protected readonly against = computed(() => {
    const result = this.store.result();
    if (result === null) return '';
    return levelLabel(result, result.frame.exposure.referenceLevelId);
  });
  protected readonly words = computed(() => {
    const print = this.store.print();
    return print === null ? '' : homogeneityWords(print.result, this.measures(), print.book);
  });
  /** Strata that the pooled numbers could not use, each named once with its reason. */
  protected readonly leftOut = computed(() => {
    const print = this.store.print();
    if (print === null) return [];
    const said = print.result.pooled.flatMap(({ indexLevelId, leftOut }) =>
      leftOut.map(({ stratumId, issue }) => {
        const stratum = stratumLabel(print.result, stratumId);
        const level = levelLabel(print.result, indexLevelId);
        return `${stratum}, ${level}. ${notEstimable(print, issue)}`;
      }),
    );
    return [...new Set(said)];
  });
}
