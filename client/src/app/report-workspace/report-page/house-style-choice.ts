import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import type { HouseStyle } from '#shared/house-style';
import { HouseStylesApi } from '../../server-api/house-styles-api';
import { Notices } from '../../ui/notices/notices';
import { BlockActions } from '../block-actions/block-actions';
import { ReportState } from '../report-store/report-state';

/** The house style of the report, for who may choose it. The list is fetched when it is opened. */
@Component({
  selector: 'eh-house-style-choice',
  template: `
    <label>
      House style:
      <select (focus)="fetch()" (mousedown)="fetch()" (change)="choose($event)">
        @for (style of styles(); track style.id) {
          <option [value]="style.id" [selected]="style.id === chosen()">{{ style.name }}</option>
        }
      </select>
    </label>
  `,
  styles: `
    label {
      display: inline-flex;
      gap: 4px;
      align-items: center;
    }
    select {
      min-height: 24px;
      max-width: 200px;
      padding: 0 2px;
      border: 0;
      border-bottom: 1px solid var(--edge);
      border-radius: 0;
      background: transparent;
      color: var(--ink-2);
      font: inherit;
      cursor: pointer;
    }
    select:focus-visible {
      outline-offset: -1px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class HouseStyleChoice {
  private readonly api = inject(HouseStylesApi);
  private readonly state = inject(ReportState);
  private readonly actions = inject(BlockActions);
  private readonly notices = inject(Notices);

  private readonly fetched = signal<readonly HouseStyle[] | null>(null);
  protected readonly chosen = computed(() => this.state.report()?.houseStyleId ?? '');
  protected readonly styles = computed(() => {
    const shown = this.state.houseStyle();
    return this.fetched() ?? (shown === null ? [] : [shown]);
  });

  protected fetch(): void {
    if (this.fetched() !== null) return;
    this.fetched.set(this.styles());
    this.api.list().subscribe({
      next: (styles) => {
        this.state.takeStyles(styles);
        this.fetched.set(styles);
      },
      error: (failure: unknown) => {
        this.fetched.set(null);
        this.notices.refuse(failure);
      },
    });
  }

  protected choose(event: Event): void {
    const houseStyleId = (event.target as HTMLSelectElement).value;
    this.actions.make([{ kind: 'setHouseStyle', houseStyleId }]);
  }
}
