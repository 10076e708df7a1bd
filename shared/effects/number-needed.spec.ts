import { describe, expect, it } from 'vitest';
import type { Estimate } from '#shared/stats';
import { numberNeeded } from './number-needed';

function difference(value: number, lower: number, upper: number): Estimate {
  return { value, interval: { lower, upper, level: 0.95, method: 'newcombe' } };
}

describe('numberNeeded', () => {
  it('rounds the value up and the limits outwards', () => {
    expect(numberNeeded(difference(-0.15, -0.29, -0.016), null)).toEqual({
      value: { change: 'fewer', count: 7 },
      limits: { kind: 'oneSided', change: 'fewer', nearest: 3, farthest: 63 },
    });
  });

  it('runs through infinity when the limits lie on both sides of 0', () => {
    expect(numberNeeded(difference(-0.02, -0.07, 0.03), null).limits).toEqual({
      kind: 'throughInfinity',
      fewer: 14,
      more: 33,
    });
  });

  it('is infinite for no difference and at a limit of exactly 0', () => {
    expect(numberNeeded(difference(0, -0.1, 0.1), null).value.count).toBeNull();
    expect(numberNeeded(difference(0.1, 0, 0.2), null).limits).toEqual({
      kind: 'oneSided',
      change: 'more',
      nearest: 5,
      farthest: null,
    });
    expect(numberNeeded(difference(0, 0, 0), null).limits).toMatchObject({ nearest: null });
  });

  it('does not round up on the last bit of a double', () => {
    // 0.3 - 0.2 is 0.09999999999999998, whose inverse lies a hair above 10.
    expect(numberNeeded(difference(0.3 - 0.2, 0.3 - 0.2, 0.5), null)).toMatchObject({
      value: { count: 10 },
      limits: { nearest: 2, farthest: 10 },
    });
  });

  it('counts exactly from the fraction', () => {
    const exact = { numerator: -3, denominator: 30_000_001 };
    expect(numberNeeded(difference(-1e-7, -0.1, 0.1), exact).value.count).toBe(10_000_001);
  });
});
