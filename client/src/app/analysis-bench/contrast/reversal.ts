import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { EFFECT_MEASURES, type EffectMeasureId } from '#shared/effects';
import { contrastTable, layerAt, pooledAt } from '#shared/analysis';
import type { Estimate, FourfoldTable } from '#shared/stats';
import { Icon } from '../../ui/marks/icon';
import { keyCommands } from '../../ui/keys/key-commands';
import { BenchStore } from '../bench/bench-store';
import { levelLabel } from '../bench/result-scopes';
import { withReference } from '../draft/analysis-draft';
import { type BenchPrint, estimateText, shownMeasures } from '../print/bench-print';

/** Turns the contrast round, and shows both ways beside each other before anybody does. */
@Component({
  selector: 'eh-reversal',
  imports: [Icon],
  template: `
    @if (store.result() !== null && store.levelId() !== null) {
      <button type="button" class="button" [disabled]="!store.mayEdit()" (click)="reverse()">
        <eh-icon name="swap" />
        Reverse the contrast
        <kbd>X</kbd>
      </button>
      <dl class="numeric">
        @for (way of ways(); track way.words) {
          <dt>{{ way.words }}</dt>
          <dd>{{ way.sizes }}</dd>
        }
      </dl>
    }
  `,
  styleUrl: './reversal.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Reversal {
  protected readonly store = inject(BenchStore);
  protected readonly ways = computed(() => {
    const print = this.store.print();
    return print === null ? [] : bothWays(print, this.store);
  });

  constructor() {
    keyCommands([
      {
        key: 'X',
        says: 'Reverse the contrast',
        group: 'Analysis',
        inStrip: true,
        active: () => this.store.mayEdit() && this.store.levelId() !== null,
        run: () => {
          this.reverse();
        },
      },
    ]);
  }

  /** The level in view becomes the one reference; what was the reference comes into view. */
  protected reverse(): void {
    const [levelId, before] = [this.store.levelId(), this.store.draft().exposure.referenceLevelId];
    if (levelId === null || before === null || !this.store.mayEdit()) return;
    this.store.change((draft) => withReference(draft, levelId));
    this.store.levelId.set(before);
  }
}

interface Way {
  readonly words: string;
  readonly sizes: string;
}

function bothWays(print: BenchPrint, store: BenchStore): readonly Way[] {
  const [index, reference] = [store.levelId(), print.result.frame.exposure.referenceLevelId];
  const scope = store.scope();
  const layer = layerAt(print.result, scope);
  const table = contrastTable(layer, index);
  const contrast =
    scope.kind === 'pooled'
      ? pooledAt(print.result, index)
      : layer?.contrasts.find(({ indexLevelId }) => indexLevelId === index);
  if (contrast === undefined) return [];
  const [one, other] = [levelLabel(print.result, index), levelLabel(print.result, reference)];
  const sizes = (pick: (id: EffectMeasureId) => string): string =>
    shownMeasures(print.result).map(pick).join(', ');
  const estimateOf = (id: EffectMeasureId): Estimate | null => {
    const estimate = contrast.measures[id];
    return estimate.ok ? estimate.value : null;
  };
  return [
    {
      words: `${one} against ${other}`,
      sizes: sizes((id) => size(print, id, estimateOf(id), table)),
    },
    {
      words: `${other} against ${one}`,
      sizes: sizes((id) => size(print, id, turned(id, estimateOf(id)), turnedTable(table))),
    },
  ];
}

function turned(id: EffectMeasureId, estimate: Estimate | null): Estimate | null {
  const reversed = estimate === null ? null : EFFECT_MEASURES[id].reverse(estimate);
  return reversed?.ok === true ? reversed.value : null;
}

function turnedTable(table: FourfoldTable | undefined): FourfoldTable | undefined {
  return table && { index: table.reference, reference: table.index };
}

function size(
  print: BenchPrint,
  id: EffectMeasureId,
  estimate: Estimate | null,
  table: FourfoldTable | undefined,
): string {
  if (estimate === null) return 'not estimable';
  const text = estimateText(print, id, estimate, table).value.text;
  return id === 'riskDifference' ? text : `${text}×`;
}
