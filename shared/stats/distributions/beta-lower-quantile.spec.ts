import quantile from '@stdlib/stats-base-dists-beta-quantile';
import { describe, expect, it } from 'vitest';
import { betaQuantile } from './beta';
import { betaLowerQuantile } from './beta-lower-quantile';

const TAILS = [0.5, 0.25, 0.1, 0.05, 0.025, 0.005, 0.0005];

describe('betaLowerQuantile', () => {
  it('has the closed forms of a shape of 1', () => {
    for (const tail of TAILS) {
      for (const shape of [1, 1.5, 4, 31, 32, 700, 3000]) {
        expectSame(betaLowerQuantile(tail, shape, 1), tail ** (1 / shape));
        expectSame(betaLowerQuantile(tail, 1, shape), -Math.expm1(Math.log1p(-tail) / shape));
      }
    }
  });

  it('agrees with the inverse of the incomplete beta function of stdlib', () => {
    for (const tail of TAILS) {
      for (const [a, b] of shapes()) {
        expectSame(betaLowerQuantile(tail, a, b), quantile(tail, a, b));
      }
    }
  });

  it('leaves large and small shapes to others, and what it does not find', () => {
    expect(betaLowerQuantile(1e-12, 14, 1)).toBeNaN();
    expectSame(betaQuantile(1e-12, 14, 1), 1e-12 ** (1 / 14));
    expect(betaLowerQuantile(0.025, 0.5, 20.5)).toBeNaN();
    expect(betaLowerQuantile(0.025, 3, 5_000_000)).toBeNaN();
  });
});

function expectSame(found: number, expected: number): void {
  expect(Math.abs(found - expected)).toBeLessThan(5e-13 * expected);
}

function shapes(): readonly (readonly [number, number])[] {
  const sizes = [1, 1.5, 2, 2.5, 7, 13.5, 16, 31, 40.5, 150, 777.5, 1900];
  return sizes.flatMap((a) => sizes.map((b) => [a, b] as const));
}
