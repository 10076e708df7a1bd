import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import type { EffectMeasureId } from '#shared/effects';
import { type ColumnHeads, columnHeads } from '#shared/wording';
import { intervalLabel } from '#shared/format';
import { BalanceGaugeView } from '../../ui/balance/balance-gauge';
import { commonEnd } from '../../ui/balance/gauge-scale';
import { ScrollSideways } from '../../ui/scroll-sideways';
import { BenchStore } from '../bench/bench-store';
import { levelLabel, sameScope, scopeLabel } from '../bench/result-scopes';
import { shownMeasures } from '../print/bench-print';
import { type EstimateRow, estimateRows } from '../print/estimate-rows';
import { ScopeTabs } from './scope-tabs';
import { TestsLine } from './tests-line';

/** Every level against the reference in one layer: both sizes, drawn and printed. */
@Component({
  selector: 'eh-estimates-panel',
  imports: [BalanceGaugeView, ScopeTabs, ScrollSideways, TestsLine],
  templateUrl: './estimates-panel.html',
  styleUrl: './estimates-panel.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class EstimatesPanel {
  protected readonly store = inject(BenchStore);

  protected readonly measures = computed<readonly EffectMeasureId[]>(() => {
    const result = this.store.result();
    return result === null ? [] : shownMeasures(result);
  });
  protected readonly heads = computed<ColumnHeads | null>(() => {
    const print = this.store.print();
    if (print === null) return null;
    return columnHeads({ analysisId: '', result: print.result }, print.style, print.book);
  });
  protected readonly rows = computed<readonly EstimateRow[]>(() => {
    const print = this.store.print();
    const analysisId = this.store.saved()?.id ?? 'draft';
    return print === null ? [] : estimateRows(print, this.store.scope(), analysisId);
  });
  /** Rows share one scale, so that they can be compared. */
  protected readonly end = computed(() =>
    commonEnd(this.rows().flatMap(({ balance }) => balance?.gauge ?? [])),
  );
  protected readonly against = computed(() => {
    const result = this.store.result();
    if (result === null) return '';
    return levelLabel(result, result.frame.exposure.referenceLevelId);
  });
  protected readonly gaugeHead = computed(() =>
    this.measures().includes('riskDifference') ? 'In 100, as multiples' : 'As multiples',
  );
  protected readonly level = computed(() => {
    const print = this.store.print();
    if (print === null) return '';
    return intervalLabel(print.result.specification.level, print.style);
  });
  protected readonly caption = computed(
    () => `Every level against ${this.against()}, with ${this.level()}`,
  );
  /** Says the layer and its first row once the result moves, for who cannot see it. */
  protected readonly said = computed(() => {
    const result = this.store.result();
    const row = this.rows().find(({ levelId }) => levelId === this.store.levelId());
    if (result === null || row === undefined) return '';
    const layer = scopeLabel(result, this.store.scope());
    return `${layer}, ${row.label} against ${this.against()}. ${row.balance?.name ?? ''}`;
  });
  protected readonly tabId = computed(() => {
    const at = this.store.scopes().findIndex((scope) => sameScope(scope, this.store.scope()));
    return this.store.scopes().length > 1 ? `scope-tab-${at}` : null;
  });
}
