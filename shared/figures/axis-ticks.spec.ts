import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { axisTicks } from './axis-ticks';

describe('axisTicks', () => {
  it.each([
    [27.7, [0, 10, 20, 30], 0],
    [30, [0, 10, 20, 30], 0],
    [61, [0, 20, 40, 60, 80], 0],
    [99.2, [0, 20, 40, 60, 80, 100], 0],
    [12.4, [0, 2.5, 5, 7.5, 10, 12.5], 1],
    [0.8, [0, 0.2, 0.4, 0.6, 0.8], 1],
    [0.041, [0, 0.01, 0.02, 0.03, 0.04, 0.05], 2],
  ])('covers %d', (highest, values, decimals) => {
    expect(axisTicks(highest, 100)).toEqual({ values, decimals });
  });

  it('ends a share’s axis at 100', () => {
    expect(axisTicks(117, 100).values.at(-1)).toBe(100);
  });

  it('has an axis when nothing is shown', () => {
    expect(axisTicks(0, 100).values.length).toBeGreaterThan(1);
  });

  it('starts at zero, covers the highest value and has at most five intervals', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-6, max: 100, noNaN: true }), (highest) => {
        const { values, decimals } = axisTicks(highest, 100);
        expect(values[0]).toBe(0);
        expect(values.at(-1)).toBeGreaterThanOrEqual(highest * (1 - 1e-8));
        expect(values.length).toBeLessThanOrEqual(6);
        for (const value of values) expect(Number(value.toFixed(decimals))).toBe(value);
      }),
    );
  });
});
