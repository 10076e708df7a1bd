import { describe, expect, it } from 'vitest';
import { fisherOfFourfold } from './fisher';
import { noLikelierThan } from './hypergeometric-ties';

function pValue(a: number, m: number, c: number, n: number): number {
  const table = { index: { events: a, total: m }, reference: { events: c, total: n } };
  const outcome = fisherOfFourfold(table);
  return outcome.ok ? outcome.value.pValue : NaN;
}

describe('fisherOfFourfold', () => {
  it.each([
    // Fisher (1935): tea, twins.
    [3, 4, 1, 4, 0.4857142857],
    [10, 13, 2, 17, 0.000536724],
    [5, 10, 5, 10, 1],
  ])('%d/%d against %d/%d: %d', (a, m, c, n, expected) => {
    expect(pValue(a, m, c, n)).toBeCloseTo(expected, 9);
  });

  it('is not defined when nobody has the event', () => {
    expect(pValue(0, 3, 0, 5)).toBeNaN();
  });

  it('counts tied tables on the other side', () => {
    // Equal groups: 3 and 0 of 3 + 3 are equally likely, 1/20 each.
    expect(pValue(3, 3, 0, 3)).toBeCloseTo(0.1, 14);
    expect(pValue(140, 400, 100, 400)).toBeCloseTo(pValue(100, 400, 140, 400), 14);
  });

  it('stays accurate far out, for ten million people, without hanging', () => {
    // R 4.2.2: fisher.test(matrix(c(20, 4999980, 60, 4999940), 2))$p.value
    expect(pValue(20, 5_000_000, 60, 5_000_000) / 8.57987559226e-6).toBeCloseTo(1, 9);
    expect(pValue(4_000_000, 5_000_000, 1_000_000, 5_000_000)).toBe(0);
    expect(pValue(2_500_000, 5_000_000, 2_500_001, 5_000_000)).toBeCloseTo(1, 3);
  });
});

describe('noLikelierThan', () => {
  it('compares the products of binomial coefficients', () => {
    // C(6,1) C(10,2) = 270 and C(6,2) C(10,1) = 150.
    expect(noLikelierThan(1, { marked: 6, unmarked: 10, drawn: 3 })(2)).toBe(true);
    expect(noLikelierThan(2, { marked: 6, unmarked: 10, drawn: 3 })(1)).toBe(false);
  });

  it('sees ties, of equal margins and of chance', () => {
    expect(noLikelierThan(2, { marked: 3, unmarked: 3, drawn: 3 })(1)).toBe(true);
    // C(14,4) C(2,1) = 1001 * 2 = 2002 = C(14,5) C(2,0).
    const tied = { marked: 14, unmarked: 2, drawn: 5 };
    expect(noLikelierThan(5, tied)(4)).toBe(true);
    expect(noLikelierThan(4, tied)(5)).toBe(true);
  });
});
