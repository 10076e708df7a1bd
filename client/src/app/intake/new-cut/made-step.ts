import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { RouterLink } from '@angular/router';
import { CurrentStudy } from '../../session/current-study';
import { shortDate } from '../../ui/dates';
import { NewCutStore } from './new-cut-store';

/** The cut is made: where to go from here. */
@Component({
  selector: 'eh-made-step',
  imports: [RouterLink],
  template: `
    @if (store.made(); as cut) {
      <section class="panel">
        <h2 tabindex="-1">Cut {{ cut.number }} of {{ cut.dataSetName }} is made</h2>
        <p class="second">
          {{ cut.rows.toLocaleString('en') }} rows of {{ cut.fileName }}, data of
          {{ date(cut.dataDate) }}.
        </p>
        <p class="actions">
          <a class="button primary" [routerLink]="[...home(), 'analyses', 'new']">
            Start an analysis
          </a>
          <a class="button" [routerLink]="[...home(), 'code-book', cut.dataSetId]">
            Open its code book
          </a>
          <a class="button" [routerLink]="[...home(), 'data', 'cuts', cut.id]">Look at the cut</a>
        </p>
      </section>
    }
  `,
  styles: `
    section {
      display: grid;
      gap: 8px;
      max-width: 760px;
      padding: 18px;
    }
    h2 {
      font: 600 20px/28px var(--sans);
    }
    .actions {
      display: flex;
      flex-wrap: wrap;
      gap: 10px;
      padding-top: 8px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MadeStep {
  protected readonly store = inject(NewCutStore);
  private readonly study = inject(CurrentStudy).study;
  protected readonly home = computed(() => ['/studies', this.study()?.id ?? '']);
  protected readonly date = shortDate;
}
