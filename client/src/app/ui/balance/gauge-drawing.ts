import type { BalanceGauge, GaugeEdge } from '#shared/wording';

/** A bar between two places, in the unit of the gauge. */
export interface GaugeBar {
  readonly from: number;
  readonly to: number;
}

/** Limits on one edge; an end that lies off the scale is drawn as an arrow. */
export interface GaugeWhisker extends GaugeBar {
  readonly beyondStart: boolean;
  readonly beyondEnd: boolean;
}

/**
 * What one edge reads: the span between the two groups, and its limits. The two edges of a pooled
 * claim need not end at the same place; each half of the bar then has its own end.
 */
export interface EdgeDrawing {
  readonly span: GaugeBar;
  readonly whisker: GaugeWhisker;
  readonly change: 'rise' | 'fall';
}

/** Everything that the gauge draws. */
export interface GaugeDrawing {
  /** What both groups have: up to the smaller of the two. */
  readonly common: number;
  readonly absolute: EdgeDrawing | null;
  readonly relative: EdgeDrawing | null;
}

/** Places bars and whiskers on a scale that ends at `end`. */
export function gaugeDrawing(gauge: BalanceGauge, end: number): GaugeDrawing {
  const reference = gauge.kind === 'risks' ? gauge.referenceRisk : 1;
  const absolute = gauge.kind === 'risks' ? gauge.absolute : null;
  const ends = [absolute, gauge.relative].filter((edge) => edge !== null);
  return {
    common: Math.max(0, Math.min(reference, ...ends.map(({ value }) => value))),
    absolute: edgeDrawing(absolute, reference, end),
    relative: edgeDrawing(gauge.relative, reference, end),
  };
}

function edgeDrawing(edge: GaugeEdge | null, reference: number, end: number): EdgeDrawing | null {
  if (edge === null) return null;
  const value = within(edge.value, end);
  return {
    span: { from: Math.min(reference, value), to: Math.max(reference, value) },
    whisker: {
      from: within(edge.lower, end),
      to: within(edge.upper, end),
      beyondStart: edge.lower < 0,
      beyondEnd: edge.upper > end,
    },
    change: edge.value >= reference ? 'rise' : 'fall',
  };
}

function within(value: number, end: number): number {
  return Math.min(Math.max(value, 0), end);
}
