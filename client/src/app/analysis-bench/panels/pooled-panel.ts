import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { findGuards, homogeneityId, poolingId } from '#shared/analysis';
import { EFFECT_MEASURES, type EffectMeasureId } from '#shared/effects';
import { columnHeads, guardWords, homogeneityWords } from '#shared/wording';
import { Field } from '../../ui/field/field';
import { FieldControl } from '../../ui/field/field-control';
import { ScrollSideways } from '../../ui/scroll-sideways';
import { BenchStore } from '../bench/bench-store';
import { levelLabel } from '../bench/result-scopes';
import { withHomogeneity } from '../draft/analysis-draft';
import { shownMeasures } from '../print/bench-print';
import { pooledRows, untestedWords } from '../print/pooled-rows';

import { StandardShares } from './standard-shares';

/** The contrasts pooled over strata, and whether the strata differ. */
@Component({
  selector: 'eh-pooled-panel',
  imports: [Field, FieldControl, ScrollSideways, StandardShares],
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
  /** The pooling methods in use, each once. */
  protected readonly poolings = computed(() => {
    const specification = this.store.result()?.specification;
    if (specification === undefined) return '';
    const names = this.measures().map(
      (id) => EFFECT_MEASURES[id].poolings[poolingId(specification, id)]?.shortLabel ?? '',
    );
    return [...new Set(names)].join('; ');
  });
  /** Tests of whether the strata differ, for measures that have several. */
  protected readonly homogeneities = computed(() => {
    const specification = this.store.result()?.specification;
    const heads = this.heads();
    if (specification === undefined || heads === null) return [];
    return this.measures()
      .map((measure) => ({
        measure,
        label: `Test of whether strata differ, ${heads[measure].toLowerCase()}`,
        methods: Object.values(EFFECT_MEASURES[measure].homogeneities),
        chosenId: homogeneityId(specification, measure),
      }))
      .filter(({ methods }) => methods.length > 1);
  });
  protected readonly showsOdds = computed(() => this.measures().includes('oddsRatio'));
  protected readonly caption = computed(
    () => `Every level against ${this.against()}, pooled over ${this.over()}`,
  );
  protected readonly missingMark = computed(
    () => this.store.print()?.style.table.missingCell.mark ?? '',
  );
  /** Why a test has no p-value, each reason once with the levels that it is for. */
  protected readonly untested = computed(() => untestedWords(this.rows()));
  /** Strata that the pooled numbers could not use, as their guard says it. */
  protected readonly leftOut = computed(() => {
    const print = this.store.print();
    if (print === null) return [];
    const analysis = { analysisId: '', result: print.result };
    return findGuards(print.result)
      .filter(({ guardId }) => guardId === 'stratumLeftOut')
      .map((finding) => guardWords(finding, analysis, print.style, print.book).sentence);
  });

  protected chooseTest(measure: EffectMeasureId, event: Event): void {
    const { value } = event.target as HTMLSelectElement;
    this.store.change((draft) => withHomogeneity(draft, measure, value));
  }
}
