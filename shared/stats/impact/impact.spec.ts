import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  RISK_RATIO_INTERVALS,
  eValue,
  fractionInExposed,
  fractionOfExposedCases,
  levinFraction,
  populationFraction,
  riskRatioOf,
} from '#shared/stats';
import type { FourfoldTable, GroupCount } from '#shared/stats';

const SEEDED = { seed: 20251203, numRuns: 300 } as const;

const group: fc.Arbitrary<GroupCount> = fc
  .integer({ min: 4, max: 4000 })
  .chain((total) =>
    fc.record({ events: fc.integer({ min: 1, max: total - 1 }), total: fc.constant(total) }),
  );
const table: fc.Arbitrary<FourfoldTable> = fc.record({ index: group, reference: group });

describe('fraction in the exposed', () => {
  it('attributes above 1, prevents below, in order and marked as causal', () => {
    fc.assert(
      fc.property(table, (one) => {
        const result = fractionInExposed(katzOf(one));
        const { kind, value, interval, needsCausalReading } = valueOf(result);
        expect(kind).toBe(riskRatioOf(one) < 1 ? 'prevented' : 'attributable');
        expect(value).toBeGreaterThanOrEqual(0);
        expect(value).toBeLessThan(1);
        expect(interval.lower).toBeLessThanOrEqual(value);
        expect(interval.upper).toBeGreaterThanOrEqual(value);
        expect(needsCausalReading).toBe(true);
      }),
      SEEDED,
    );
  });

  it('of a reversed contrast is the same share under the other reading', () => {
    fc.assert(
      fc.property(table, (one) => {
        const straight = valueOf(fractionInExposed(katzOf(one)));
        const turned = { index: one.reference, reference: one.index };
        expect(valueOf(fractionInExposed(katzOf(turned))).value).toBeCloseTo(straight.value, 12);
      }),
      SEEDED,
    );
  });

  it('refuses limits out of order and a lower limit of 0', () => {
    const limits = { level: 0.95, method: 'katz' };
    expect(fractionInExposed({ value: 2, interval: { lower: 3, upper: 4, ...limits } }).ok).toBe(
      false,
    );
    const zero = fractionInExposed({ value: 2, interval: { lower: 0, upper: 4, ...limits } });
    expect(zero).toMatchObject({ issue: { code: 'zeroCell' } });
  });
});

describe('population fraction', () => {
  it("is Levin's formula with the crude ratio, and Miettinen's with the share of cases", () => {
    fc.assert(
      fc.property(table, (one) => {
        const { kind, value } = valueOf(populationFraction(one, 0.95, 'population'));
        const total = one.index.total + one.reference.total;
        const exposedShare = one.index.total / total;
        const riskRatio = riskRatioOf(one);
        const levin = valueOf(levinFraction({ exposedShare, riskRatio, adjustment: 'crude' }));
        const ofCases = one.index.events / (one.index.events + one.reference.events);
        expect(valueOf(fractionOfExposedCases(ofCases, riskRatio))).toBeCloseTo(levin, 9);
        const attributable = kind === 'prevented' ? 1 - 1 / (1 - value) : value;
        expect(Math.abs(attributable - levin)).toBeLessThan(1e-9 * Math.max(1, Math.abs(levin)));
      }),
      SEEDED,
    );
  });

  it('lies within its limits, which widen with the level', () => {
    fc.assert(
      fc.property(table, (one) => {
        const { value, interval } = valueOf(populationFraction(one, 0.9, 'population'));
        const wide = valueOf(populationFraction(one, 0.99, 'population')).interval;
        expect(interval.lower).toBeLessThanOrEqual(value);
        expect(interval.upper).toBeGreaterThanOrEqual(value);
        expect(wide.lower).toBeLessThanOrEqual(interval.lower);
        expect(wide.upper).toBeGreaterThanOrEqual(interval.upper);
      }),
      SEEDED,
    );
  });

  it('is refused where it is not defined', () => {
    const some = { events: 3, total: 20 };
    const none = { events: 0, total: 20 };
    const code = (one: FourfoldTable, sampling: 'population' | 'casesAndControls') => {
      const result = populationFraction(one, 0.95, sampling);
      return result.ok ? null : result.issue.code;
    };
    expect(code({ index: some, reference: some }, 'casesAndControls')).toBe('notGivenByDesign');
    expect(code({ index: some, reference: none }, 'population')).toBe('zeroCell');
    expect(code({ index: none, reference: none }, 'population')).toBe('noEvents');
    expect(code({ index: { events: 0, total: 0 }, reference: some }, 'population')).toBe(
      'emptyGroup',
    );
  });

  it("refuses Levin's formula with an adjusted ratio", () => {
    const parts = { exposedShare: 0.4, riskRatio: 2, adjustment: 'adjusted' } as const;
    expect(levinFraction(parts)).toMatchObject({ issue: { code: 'adjustedInCrudeFormula' } });
  });
});

describe('E-value', () => {
  it('is the same for a ratio and its inverse, grows with it, and bounds the confounding', () => {
    fc.assert(
      fc.property(fc.double({ min: 1, max: 500, noNaN: true }), (ratio) => {
        const { ofValue } = valueOf(eValue({ value: ratio, lower: ratio, upper: ratio }));
        const inverse = 1 / ratio;
        const back = valueOf(eValue({ value: inverse, lower: inverse, upper: inverse }));
        expect(Math.abs(back.ofValue / ofValue - 1)).toBeLessThan(1e-7);
        expect(ofValue).toBeGreaterThanOrEqual(ratio);
        expect(ofValue ** 2 / (2 * ofValue - 1)).toBeCloseTo(ratio, 8);
      }),
      SEEDED,
    );
  });

  it('is 1 for limits that hold 1, and refuses what is no ratio', () => {
    expect(valueOf(eValue({ value: 1.3, lower: 0.9, upper: 1.9 })).ofLimit).toBe(1);
    expect(eValue({ value: 1.3, lower: 0, upper: 1.9 }).ok).toBe(false);
    expect(eValue({ value: 1.3, lower: 1.4, upper: 1.9 }).ok).toBe(false);
    expect(eValue({ value: Infinity, lower: 2, upper: Infinity }).ok).toBe(false);
  });
});

function katzOf(one: FourfoldTable) {
  const interval = valueOf(RISK_RATIO_INTERVALS.katz.interval(one, 0.95));
  return { value: riskRatioOf(one), interval };
}

function valueOf<Value>(
  result:
    { readonly ok: true; readonly value: Value } | { readonly ok: false; readonly issue: unknown },
): Value {
  if (!result.ok) {
    throw new Error(JSON.stringify(result.issue));
  }
  return result.value;
}
