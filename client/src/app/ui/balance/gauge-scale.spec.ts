import type { BalanceGauge, GaugeEdge } from '#shared/wording';
import { describe, expect, it } from 'vitest';
import { commonEnd, furthest, gaugeScale, type GaugeTick } from './gauge-scale';

const edge = (value: number, lower: number, upper: number): GaugeEdge => ({ value, lower, upper });

function risks(referenceRisk: number, absolute: GaugeEdge, relative = absolute): BalanceGauge {
  return { kind: 'risks', referenceRisk, absolute, relative, gapText: null };
}

const WARD = risks(11 / 236, edge(0.2086, 0.1436, 0.2806), edge(0.2086, 0.109, 0.4));

function labels(ticks: readonly GaugeTick[]): (string | null)[] {
  return ticks.map(({ label }) => label).filter((label) => label !== null);
}

function scaleOf(gauge: BalanceGauge, mostLabels = 8) {
  return gaugeScale(gauge, { end: furthest(gauge), mostLabels });
}

describe('the upper edge', () => {
  it('runs from zero to the next named tick past every limit', () => {
    const scale = scaleOf(WARD);
    expect(scale.end).toBe(0.4);
    expect(labels(scale.people).slice(0, 3)).toEqual(['0 in 100', '5', '10']);
  });

  it('ticks every person where fives are named', () => {
    const { people } = scaleOf(WARD);
    expect(people[1]).toEqual({ at: 0.01, label: null });
    expect(people[5]).toEqual({ at: 0.05, label: '5' });
  });

  it('names fewer ticks where there is less room', () => {
    expect(labels(scaleOf(WARD, 3).people)).toEqual(['0 in 100', '20', '40']);
  });

  it('never passes 100 in 100', () => {
    const scale = scaleOf(risks(0.6, edge(0.9, 0.8, 0.97), edge(0.9, 0.7, 1.4)));
    expect(scale.end).toBe(1);
    expect(labels(scale.people).at(-1)).toBe('100');
  });

  it('shows rare outcomes in parts of a person, without stray digits', () => {
    const scale = scaleOf(risks(0.0004, edge(0.0011, 0.0002, 0.0021)));
    expect(labels(scale.people)).toEqual(['0 in 100', '0.05', '0.1', '0.15', '0.2', '0.25']);
  });
});

describe('the lower edge', () => {
  it('ticks each half multiple of the reference and names the whole ones', () => {
    const { multiples } = scaleOf(risks(0.1, edge(0.2, 0.15, 0.28)));
    expect(multiples.map(({ label }) => label)).toEqual(['0', null, '1×', null, '2×', null, '3×']);
    expect(multiples[2]?.at).toBeCloseTo(0.1, 12);
  });

  it('is bare when the reference has no events', () => {
    expect(scaleOf(risks(0, edge(0.2, 0.1, 0.3))).multiples).toEqual([]);
  });
});

describe('how far it reaches', () => {
  it('leaves a limit that lies far out to an arrow, so that the bar stays visible', () => {
    const gauge = risks(0.02, edge(0.04, 0.01, 0.08), edge(0.04, 0.01, 0.9));
    expect(furthest(gauge)).toBeCloseTo(0.16, 12);
  });

  it('gives rows that are compared one end', () => {
    expect(commonEnd([WARD, risks(0.5, edge(0.6, 0.5, 0.7))])).toBe(0.7);
  });

  it('counts from zero to past the limits of an odds ratio', () => {
    const scale = scaleOf({ kind: 'ratio', relative: edge(2.78, 1.97, 3.94) });
    expect([scale.end, scale.people]).toEqual([4, []]);
    expect(labels(scale.multiples)).toEqual(['0', '1×', '2×', '3×', '4×']);
  });

  it('survives an effect of nothing at all', () => {
    expect(scaleOf(risks(0, edge(0, 0, 0))).end).toBeGreaterThan(0);
  });
});

it('names the reference even where every second multiple is named', () => {
  const { multiples } = scaleOf(risks(0.05, edge(0.2, 0.1, 0.6), edge(0.2, 0.1, 0.7)));
  expect(labels(multiples)).toEqual(['0', '1×', '2×', '4×', '6×', '8×', '10×', '12×', '14×']);
});

it('leaves the reference unnamed where its name would touch zero', () => {
  const { multiples } = scaleOf(risks(0.01, edge(0.2, 0.1, 0.6), edge(0.2, 0.1, 0.7)));
  expect(labels(multiples)).toEqual(['0', '10×', '20×', '30×', '40×', '50×', '60×', '70×']);
});
