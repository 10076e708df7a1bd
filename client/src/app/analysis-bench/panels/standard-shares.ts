import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { poolingId } from '#shared/analysis';
import { EFFECT_MEASURE_IDS } from '#shared/effects';
import { Field } from '../../ui/field/field';
import { FieldControl } from '../../ui/field/field-control';
import { BenchStore } from '../bench/bench-store';
import { withStandardShares } from '../draft/analysis-draft';
import { parsedShare } from './setting-values';

/** The strata's shares in the chosen standard population, where a measure is pooled by it. */
@Component({
  selector: 'eh-standard-shares',
  imports: [Field, FieldControl],
  template: `
    @if (isWanted()) {
      <fieldset [disabled]="!store.mayEdit()">
        <legend>Standard population, members or shares by stratum</legend>
        @for (stratum of strata(); track stratum.id) {
          <eh-field [label]="stratum.label" [problem]="problems()[stratum.id] ?? null">
            <input
              ehControl
              class="input"
              inputmode="decimal"
              [value]="shareOf(stratum.id)"
              (change)="change(stratum.id, $event)"
            />
          </eh-field>
        }
      </fieldset>
    }
  `,
  styles: `
    fieldset {
      display: grid;
      grid-template-columns: repeat(auto-fill, minmax(150px, 1fr));
      gap: 10px;
      margin: 10px 0 0;
      padding: 0;
      border: 0;
    }
    legend {
      padding-bottom: 6px;
      font: var(--t-label);
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StandardShares {
  protected readonly store = inject(BenchStore);
  protected readonly problems = signal<Readonly<Record<string, string>>>({});

  protected readonly strata = computed(() => this.store.result()?.frame.strata ?? []);
  protected readonly isWanted = computed(() => {
    const specification = this.store.specification();
    return (
      specification !== null &&
      EFFECT_MEASURE_IDS.some((id) => poolingId(specification, id) === 'standardisedToChosen')
    );
  });
  private readonly shares = computed(() => this.store.draft().otherMethods?.standardShares ?? {});

  protected shareOf(stratumId: string): string {
    return String(this.shares()[stratumId] ?? '');
  }

  protected change(stratumId: string, event: Event): void {
    const share = parsedShare((event.target as HTMLInputElement).value);
    this.problems.update((before) => {
      const others = Object.entries(before).filter(([id]) => id !== stratumId);
      return Object.fromEntries(share.ok ? others : [...others, [stratumId, share.issue]]);
    });
    if (!share.ok) return;
    const shares = { ...this.shares(), [stratumId]: share.value };
    this.store.change((draft) => withStandardShares(draft, shares));
  }
}
