import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Quantity } from '#shared/analysis';
import { rationalOf } from './rational';
import { numberOfDecimal, roundRational } from './round';

const fraction = (numerator: number, denominator: number): Quantity => ({
  kind: 'fraction',
  numerator,
  denominator,
});
const real = (value: number): Quantity => ({ kind: 'real', value });

function rounded(quantity: Quantity, scale: number, decimals: number, mode = 'halfUp' as const) {
  return numberOfDecimal(roundRational(rationalOf(quantity), scale, decimals, mode));
}

describe('rounding a fraction once', () => {
  it.each([
    { of: '1 of 8 in whole percent', got: rounded(fraction(1, 8), 100, 0), want: 13 },
    { of: '49 of 400 to one decimal', got: rounded(fraction(49, 400), 100, 1), want: 12.3 },
    {
      of: '47 of 219 in whole percent, not by way of 21.5',
      got: rounded(fraction(47, 219), 100, 0),
      want: 21,
    },
    { of: '47 of 219 to one decimal', got: rounded(fraction(47, 219), 100, 1), want: 21.5 },
    { of: 'a negative tie away from zero', got: rounded(fraction(-1, 8), 100, 0), want: -13 },
    {
      of: '57 of 200, which a double holds as 28.499…',
      got: rounded(fraction(57, 200), 100, 0),
      want: 29,
    },
  ])('$of', ({ got, want }) => {
    expect(got).toBe(want);
  });

  it.each([
    [fraction(1, 8), 0, 12],
    [fraction(3, 8), 0, 38],
    [fraction(49, 400), 1, 12.2],
    [fraction(-49, 400), 1, -12.2],
  ])('ties to the even digit where the style says so: %o', (quantity, decimals, want) => {
    const decimal = roundRational(rationalOf(quantity), 100, decimals, 'halfEven');
    expect(numberOfDecimal(decimal)).toBe(want);
  });

  it('has no negative zero', () => {
    expect(Object.is(rounded(fraction(-4, 10_000), 100, 1), 0)).toBe(true);
  });

  it('is never further than half a unit from the exact value', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: -1_000_000, max: 1_000_000 }),
        fc.integer({ min: 1, max: 1_000_000 }),
        fc.integer({ min: 0, max: 4 }),
        (numerator, denominator, decimals) => {
          const { units } = roundRational(
            rationalOf(fraction(numerator, denominator)),
            100,
            decimals,
            'halfUp',
          );
          const exact = BigInt(numerator) * 100n * 10n ** BigInt(decimals);
          const error = units * BigInt(denominator) - exact;
          const size = error < 0n ? -error : error;
          expect(2n * size <= BigInt(denominator)).toBe(true);
        },
      ),
    );
  });

  it('gives opposite numbers opposite roundings', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 5000 }), fc.integer({ min: 1, max: 5000 }), (n, d) => {
        expect(rounded(fraction(n, d), 100, 1)).toBe(-rounded(fraction(-n, d), 100, 1) || 0);
      }),
    );
  });
});

describe('rounding a real number', () => {
  it.each([
    [0.285, 2, 0.29],
    [1.005, 2, 1.01],
    [0.996, 2, 1],
    [2.675, 2, 2.68],
    [1e-7, 3, 0],
    [123456.5, 0, 123457],
  ])('%d to %d decimals is %d, by its decimal digits', (value, decimals, want) => {
    expect(rounded(real(value), 1, decimals)).toBe(want);
  });

  it('does not hang on the last digits that engines differ in', () => {
    const tie = 0.125;
    expect(rounded(real(tie - 2e-16), 1, 2)).toBe(0.13);
    expect(rounded(real(tie + 2e-16), 1, 2)).toBe(0.13);
  });

  it('keeps very large and very small numbers', () => {
    expect(rounded(real(1.5e15), 1, 0)).toBe(1.5e15);
    expect(rounded(real(3.4e-5), 1, 6)).toBe(0.000034);
  });
});
