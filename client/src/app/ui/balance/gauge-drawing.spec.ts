import type { BalanceGauge, GaugeEdge } from '#shared/wording';
import { expect, it } from 'vitest';
import { gaugeDrawing } from './gauge-drawing';

const edge = (value: number, lower: number, upper: number): GaugeEdge => ({ value, lower, upper });

const RISE: BalanceGauge = {
  kind: 'risks',
  referenceRisk: 0.1,
  absolute: edge(0.25, 0.2, 0.3),
  relative: edge(0.25, 0.18, 0.35),
  gapText: null,
};

const FALL: BalanceGauge = {
  kind: 'risks',
  referenceRisk: 0.25,
  absolute: edge(0.1, -0.02, 0.2),
  relative: edge(0.1, 0.05, 0.22),
  gapText: null,
};

it('draws what both have, then what the compared group has more', () => {
  const drawing = gaugeDrawing(RISE, 0.4);
  expect(drawing.common).toBe(0.1);
  expect(drawing.absolute?.span).toEqual({ from: 0.1, to: 0.25 });
  expect(drawing.absolute?.change).toBe('rise');
});

it('draws a fall as what is left and what is gone', () => {
  const drawing = gaugeDrawing(FALL, 0.4);
  expect(drawing.common).toBe(0.1);
  expect(drawing.relative?.span).toEqual({ from: 0.1, to: 0.25 });
  expect(drawing.relative?.change).toBe('fall');
});

it('gives each edge the limits of its own measure', () => {
  const drawing = gaugeDrawing(RISE, 0.4);
  expect([drawing.absolute?.whisker.to, drawing.relative?.whisker.to]).toEqual([0.3, 0.35]);
});

it('ends limits at zero and at the end of the scale, and says so', () => {
  expect(gaugeDrawing(FALL, 0.4).absolute?.whisker).toMatchObject({ from: 0, beyondStart: true });
  expect(gaugeDrawing(RISE, 0.32).relative?.whisker).toMatchObject({ to: 0.32, beyondEnd: true });
});

it('counts multiples from one where there are no risks', () => {
  const drawing = gaugeDrawing({ kind: 'ratio', relative: edge(2.8, 2, 3.9) }, 4);
  expect([drawing.common, drawing.absolute, drawing.relative?.span]).toEqual([
    1,
    null,
    { from: 1, to: 2.8 },
  ]);
});
