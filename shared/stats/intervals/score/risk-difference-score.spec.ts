import { describe, expect, it } from 'vitest';
import type { FourfoldTable } from '../../fourfold-table';
import { miettinenNurminen } from '../risk-difference/miettinen-nurminen';
import { riskDifferenceScore } from './risk-difference-score';

function table(a: number, m: number, c: number, n: number): FourfoldTable {
  return { index: { events: a, total: m }, reference: { events: c, total: n } };
}

describe('score of a risk difference', () => {
  it('ties tables that swapping groups and outcomes turns into each other', () => {
    for (let at = -95; at <= 95; at += 1) {
      for (let a = 0; a <= 5; a += 1) {
        for (let c = 0; c <= 5; c += 1) {
          const score = riskDifferenceScore(table(a, 5, c, 5))(at / 100 + 0.001);
          const mirrored = riskDifferenceScore(table(5 - c, 5, 5 - a, 5))(at / 100 + 0.001);
          expect(Math.abs(mirrored - score)).toBeLessThan(1e-12 * Math.max(1, Math.abs(score)));
        }
      }
    }
  });

  it('is smooth to the last digits in the tested difference', () => {
    const score = riskDifferenceScore(table(20, 162, 5, 40));
    for (let at = -0.2; at < 0.2; at += 0.0007) {
      const bend = score(at) - (score(at - 1e-9) + score(at + 1e-9)) / 2;
      expect(Math.abs(bend)).toBeLessThan(1e-13 * 40);
    }
  });

  // Bisection of the likelihood equation and of the limits with 40 decimal digits (mpmath).
  it.each([
    [table(20, 162, 5, 40), -0.1446732862799408],
    [table(44, 228, 5, 40), -0.0755243823196343],
  ])('gives limits to 1e-14', (of, lower) => {
    const interval = miettinenNurminen.interval(of, 0.95);
    expect(interval.ok && interval.value.lower).toBeCloseTo(lower, 14);
  });
});
