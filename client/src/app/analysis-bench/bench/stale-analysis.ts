import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import type { AnalysisView } from '#shared/api';
import { BenchStore } from './bench-store';
import { type NamedDraft, specificationDifferences } from './specification-differences';

/** Somebody saved a newer version meanwhile: both are shown, and nothing is lost. */
@Component({
  selector: 'eh-stale-analysis',
  template: `
    <h2>Somebody saved version {{ theirs().version }} while you edited</h2>
    <p class="second">
      Nothing is lost. What only they changed stays as theirs; in these parts yours differs.
    </p>
    <table class="three-rule">
      <thead>
        <tr>
          <th scope="col" class="words">What</th>
          <th scope="col" class="words">Yours</th>
          <th scope="col" class="words">Theirs</th>
        </tr>
      </thead>
      <tbody>
        @for (difference of differences(); track difference.what) {
          <tr>
            <th scope="row">{{ difference.what }}</th>
            <td class="words">{{ difference.mine }}</td>
            <td class="words">{{ difference.theirs }}</td>
          </tr>
        }
      </tbody>
    </table>
    <p class="actions">
      <button type="button" class="button" (click)="taken.emit()">Take theirs</button>
      <button type="button" class="button" (click)="kept.emit()">Put mine on top</button>
    </p>
  `,
  styles: `
    :host {
      display: grid;
      gap: 10px;
      padding: 16px 18px;
      border: 1px solid var(--line);
      border-top: 3px solid var(--ochre);
      border-radius: var(--r2);
      background: var(--page);
    }
    h2 {
      font: var(--t-title);
    }
    td {
      padding-right: 18px;
    }
    .actions {
      display: flex;
      gap: 10px;
    }
  `,
  host: { role: 'alert' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StaleAnalysis {
  /** Their version with one's own changes on top. */
  readonly mine = input.required<NamedDraft>();
  readonly theirs = input.required<AnalysisView>();
  readonly kept = output();
  readonly taken = output();

  private readonly store = inject(BenchStore);
  protected readonly differences = computed(() => {
    const theirs = this.theirs();
    return specificationDifferences(this.mine(), theirs, this.store.codeBook());
  });
}
