import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

/** The line gauge with one bar: what is happening, how far, and under it how long it may take. */
@Component({
  selector: 'eh-progress-gauge',
  template: `
    <div class="words">
      <b [id]="id">{{ doing() }}</b>
      <span class="numeric">{{ measure() }}</span>
    </div>
    <div
      class="gauge"
      role="progressbar"
      aria-valuemin="0"
      aria-valuemax="100"
      [attr.aria-valuenow]="percent()"
      [attr.aria-labelledby]="id"
    >
      <i [style.width.%]="percent()"></i>
    </div>
    <ng-content />
  `,
  styleUrl: './progress-gauge.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ProgressGauge {
  private static made = 0;
  protected readonly id = `progress-${++ProgressGauge.made}`;

  readonly doing = input.required<string>();
  /** Share done, 0..1. */
  readonly share = input.required<number>();
  /** How far in words, as in "4 of 7"; the percentage when none is given. */
  readonly reached = input('');

  protected readonly percent = computed(() =>
    Math.round(100 * Math.min(1, Math.max(0, this.share()))),
  );
  protected readonly measure = computed(() => this.reached() || `${this.percent()}%`);
}
