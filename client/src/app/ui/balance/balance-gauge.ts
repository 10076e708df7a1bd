import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { Balance, BalanceGauge } from '#shared/wording';
import type { Framing } from '#shared/wording/phrase';
import { type EdgeDrawing, gaugeDrawing, type GaugeWhisker } from './gauge-drawing';
import { observedWidth } from '../observed-width';
import { furthest, gaugeScale, type GaugeTick } from './gauge-scale';
import { barLabels } from './bar-labels';

/** Where things lie, from the top, in pixels. */
interface GaugeLayout {
  readonly height: number;
  /** Where the drawing begins when it has no upper edge. */
  readonly topWithoutPeople: number;
  readonly upperRule: number;
  readonly upperWhisker: number;
  readonly bar: number;
  readonly barHeight: number;
  readonly lowerWhisker: number;
  readonly lowerRule: number;
  readonly shortTick: number;
  readonly longTick: number;
  readonly cap: number;
}

const WIDTHS = { large: 616, small: 164 } as const;
const PIXELS_PER_LABEL = 88;

const LAYOUTS: Readonly<Record<'large' | 'small', GaugeLayout>> = {
  large: {
    height: 84,
    topWithoutPeople: 28,
    upperRule: 21,
    upperWhisker: 27,
    bar: 32,
    barHeight: 20,
    lowerWhisker: 57,
    lowerRule: 63,
    shortTick: 4,
    longTick: 7,
    cap: 3.5,
  },
  small: {
    height: 24,
    topWithoutPeople: 0,
    upperRule: 3,
    upperWhisker: 5.5,
    bar: 8,
    barHeight: 8,
    lowerWhisker: 18.5,
    lowerRule: 21,
    shortTick: 3,
    longTick: 3,
    cap: 1.5,
  },
};

/**
 * One effect drawn once from zero and read on two edges: people in 100 above, multiples of the
 * reference below, each with its own limits. Small, it stands in a row, without labels.
 */
@Component({
  selector: 'eh-balance-gauge',
  templateUrl: './balance-gauge.html',
  styleUrl: './balance-gauge.scss',
  host: { '[class]': 'size()' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class BalanceGaugeView {
  readonly balance = input.required<Balance>();
  readonly gauge = input.required<BalanceGauge>();
  /** Which edges the sentence says. */
  readonly said = input<Framing>('both');
  readonly size = input<'large' | 'small'>('large');
  /** The end of the scale, where several gauges share one (see `commonEnd`). */
  readonly end = input<number>();

  private readonly room = observedWidth(WIDTHS.large);

  protected readonly layout = computed(() => LAYOUTS[this.size()]);
  protected readonly width = computed(() => (this.size() === 'small' ? WIDTHS.small : this.room()));
  protected readonly scale = computed(() =>
    gaugeScale(this.gauge(), {
      end: this.end() ?? furthest(this.gauge()),
      mostLabels: Math.max(3, Math.floor(this.width() / PIXELS_PER_LABEL)),
    }),
  );
  protected readonly drawing = computed(() => gaugeDrawing(this.gauge(), this.scale().end));
  protected readonly halves = computed(() => halvesOf(this.layout(), this.drawing()));
  protected readonly labels = computed(() =>
    barLabels(this.balance(), this.drawing(), (at) => this.x(at)),
  );
  protected readonly gapText = computed(() => {
    const gauge = this.gauge();
    return gauge.kind === 'risks' ? gauge.gapText : null;
  });

  protected readonly viewBox = computed(() => {
    const { height, topWithoutPeople } = this.layout();
    const top = this.gauge().kind === 'ratio' ? topWithoutPeople : 0;
    return `0 ${top} ${this.width()} ${height - top}`;
  });

  /** Pixels from the left end. */
  protected x(at: number): number {
    return Math.round((at / this.scale().end) * this.width() * 100) / 100;
  }

  /** One pixel stays free between the two parts of the bar. */
  protected lengthOf({ span }: EdgeDrawing): number {
    return Math.max(0, this.x(span.to) - this.x(span.from) - 1);
  }

  protected tickLength(tick: GaugeTick): number {
    return tick.label === null ? this.layout().shortTick : this.layout().longTick;
  }

  protected anchor(tick: GaugeTick): 'start' | 'middle' | 'end' {
    if (tick.at === 0) return 'start';
    return this.x(tick.at) > this.width() - 14 ? 'end' : 'middle';
  }

  /** The line of the limits with a cap, or an arrow where it runs off the scale, at each end. */
  protected whiskerPath(whisker: GaugeWhisker, y: number): string {
    const { cap } = this.layout();
    const from = this.x(whisker.from);
    const to = this.x(whisker.to);
    const start = whisker.beyondStart
      ? `M${from + cap} ${y - cap}L${from} ${y}L${from + cap} ${y + cap}`
      : `M${from} ${y - cap}V${y + cap}`;
    const end = whisker.beyondEnd
      ? `M${to - cap} ${y - cap}L${to} ${y}L${to - cap} ${y + cap}`
      : `M${to} ${y - cap}V${y + cap}`;
    return `M${from} ${y}H${to}${start}${end}`;
  }
}

/** A part of the bar that one edge adds or takes away. */
interface BarHalf {
  readonly edge: EdgeDrawing;
  readonly y: number;
  readonly height: number;
}

/** One part where both edges end alike, else one for each edge. */
function halvesOf(
  { bar, barHeight }: GaugeLayout,
  { absolute, relative }: { absolute: EdgeDrawing | null; relative: EdgeDrawing | null },
): readonly BarHalf[] {
  const whole = (edge: EdgeDrawing): BarHalf => ({ edge, y: bar, height: barHeight });
  if (absolute === null) return relative === null ? [] : [whole(relative)];
  if (relative === null || endsAlike(absolute, relative)) return [whole(absolute)];
  return [
    { edge: absolute, y: bar, height: barHeight / 2 },
    { edge: relative, y: bar + barHeight / 2, height: barHeight / 2 },
  ];
}

function endsAlike(one: EdgeDrawing, other: EdgeDrawing): boolean {
  const apart = Math.abs(one.span.to - other.span.to) + Math.abs(one.span.from - other.span.from);
  return apart < 1e-9;
}
