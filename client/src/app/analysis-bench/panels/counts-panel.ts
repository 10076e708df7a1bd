import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { columnHeads } from '#shared/wording';
import { formatCount } from '#shared/format';
import { ScrollSideways } from '../../ui/scroll-sideways';
import { BenchStore } from '../bench/bench-store';
import { columnById } from '../draft/column-choices';
import type { BenchPrint } from '../print/bench-print';
import { countsTable } from '../print/counts-rows';

/** The counts behind every number: levels by outcome, stratum by stratum. */
@Component({
  selector: 'eh-counts-panel',
  imports: [ScrollSideways],
  templateUrl: './counts-panel.html',
  styleUrl: './counts-panel.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CountsPanel {
  protected readonly store = inject(BenchStore);

  protected readonly givesRisk = computed(
    () => this.store.result()?.frame.design !== 'caseControl',
  );
  protected readonly heads = computed(() => {
    const print = this.store.print();
    return print === null ? null : headsOf(print);
  });
  protected readonly table = computed(() => {
    const print = this.store.print();
    return print === null ? null : countsTable(print);
  });
  protected readonly layerColumns = computed(() => (this.givesRisk() ? 3 : 2));
  protected readonly summary = computed(() => {
    const print = this.store.print();
    return print === null ? '' : summaryOf(print);
  });
  protected readonly leftOut = computed(() => {
    const print = this.store.print();
    return print === null ? [] : this.leftOutWords(print);
  });

  private leftOutWords({ result, style }: BenchPrint): readonly string[] {
    const parts = result.leftOut
      .filter(({ count }) => count > 0)
      .map(({ columnId, reason, count }) => {
        const label = columnById(this.store.codeBook(), columnId)?.label ?? columnId;
        return `${label}, ${reason.toLowerCase()} ${formatCount(count, style).text}`;
      });
    const restricted = formatCount(result.restricted, style).text;
    return result.restricted > 0 ? [...parts, `outside the restriction ${restricted}`] : parts;
  }
}

interface CountHeads {
  readonly level: string;
  readonly with: string;
  readonly without: string;
  readonly risk: string;
}

function headsOf({ result, style, book }: BenchPrint): CountHeads {
  const heads = columnHeads({ analysisId: '', result }, style, book);
  const isCaseControl = result.frame.design === 'caseControl';
  return {
    level: heads.level,
    with: isCaseControl ? heads.cases : 'With',
    without: isCaseControl ? heads.controls : 'Without',
    risk: heads.share,
  };
}

function summaryOf({ result, style }: BenchPrint): string {
  const { frame, counted, crude, leftOut, restricted } = result;
  const out = leftOut.reduce((sum, { count }) => sum + count, 0) + restricted;
  const parts = [
    `${formatCount(counted, style).text} ${frame.peopleNoun}`,
    `${formatCount(crude.total.events, style).text} with ${frame.outcome.noun}`,
    out === 0 ? 'none left out' : `${formatCount(out, style).text} left out`,
  ];
  return parts.join(', ');
}
