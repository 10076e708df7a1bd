import { ChangeDetectionStrategy, Component, input } from '@angular/core';

const TICKS = Array.from({ length: 13 }, (_, index) => ({
  x: 0.5 + index * 9.9,
  length: index % 3 === 0 ? 8 : 4,
}));

/** Two bare rules without a bar, one bold fact, and as content one line on what to do. */
@Component({
  selector: 'eh-empty-state',
  template: `
    <svg width="120" height="34" viewBox="0 0 120 34" aria-hidden="true">
      <path d="M0 10.5H120M0 24.5H120" />
      @for (tick of ticks; track tick.x) {
        <path [attr.d]="'M' + tick.x + ' 10v-' + tick.length" />
        <path [attr.d]="'M' + tick.x + ' 25v' + tick.length" />
      }
    </svg>
    <div>
      <b>{{ fact() }}</b>
      <span><ng-content /></span>
    </div>
  `,
  styleUrl: './empty-state.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class EmptyState {
  readonly fact = input.required<string>();
  protected readonly ticks = TICKS;
}
