import { describe, expect, it } from 'vitest';
import { RISK_DIFFERENCE_INTERVALS, RISK_RATIO_INTERVALS } from '../intervals';
import type { FourfoldTable } from '../fourfold-table';
import { extremeTables } from './extreme-tables';
import { differences, logRatios } from './null-family';
import { placeAbove, supremumOf } from './supremum';
import { tailProbability } from './tail-probability';

function table(a: number, m: number, c: number, n: number): FourfoldTable {
  return { index: { events: a, total: m }, reference: { events: c, total: n } };
}

describe('scores as an order of tables', () => {
  it.each([
    ['differences', differences(9, 7), [-0.97, -0.5, -0.1, 0, 0.3, 0.8]],
    ['log ratios', logRatios(9, 7), [-6, -1, -0.2, 0.4, 3]],
  ] as const)('%s: rise with the index events, fall with the reference events', (_, family, at) => {
    for (const tested of at) {
      const scoreOf = family.scoreAt(tested);
      for (let a = 0; a <= 9; a += 1) {
        for (let c = 0; c <= 7; c += 1) {
          const here = scoreOf(a, c);
          if (a < 9) expect(scoreOf(a + 1, c)).toBeGreaterThanOrEqual(here - 1e-12);
          if (c < 7) expect(scoreOf(a, c + 1)).toBeLessThanOrEqual(here + 1e-12);
        }
      }
    }
  });
});

describe('tailProbability', () => {
  it('is the plain sum over the extreme tables', () => {
    const scoreOf = (a: number, c: number): number => a / 6 - c / 5;
    const extreme = extremeTables(6, 5, scoreOf, 0.4, 'both');
    const chances = { reference: 0.3, indexBelow: 0.45, indexAbove: 0.25 };
    let sum = 0;
    for (let a = 0; a <= 6; a += 1) {
      for (let c = 0; c <= 5; c += 1) {
        const score = scoreOf(a, c);
        const chance = score >= 0.4 - 1e-9 ? 0.45 : score <= -0.4 + 1e-9 ? 0.25 : null;
        sum += chance === null ? 0 : term(6, a, chance) * term(5, c, 0.3);
      }
    }
    expect(tailProbability(6, 5, 0)(extreme, chances)).toBeCloseTo(sum, 14);
  });
});

describe('supremum', () => {
  const curve = (x: number): number => Math.exp(-200 * (x - 0.4031) ** 2) / 2;

  it('is refined beyond the grid', () => {
    expect(supremumOf(curve, 32)).toBeCloseTo(0.5, 12);
  });

  it('finds a peak between the places of the grid, and none above it', () => {
    expect(placeAbove(curve, 32, 0.5 - 1e-9, 0)).toBeCloseTo(0.4, 1);
    expect(placeAbove(curve, 32, 0.5 + 1e-9, 0)).toBeNull();
  });
});

describe('exact unconditional limits', () => {
  it('lie at no effect exactly where tables tie there', () => {
    const tied = RISK_DIFFERENCE_INTERVALS.agrestiMin.interval(table(6, 7, 2, 7), 0.95);
    expect(tied.ok && tied.value.lower).toBe(0);
  });

  it('count tables that tie for good', () => {
    // At the limit 0/2 against 1/2 ties with the observed table, 0/2 against 2/2 is more extreme.
    const interval = RISK_DIFFERENCE_INTERVALS.agrestiMin.interval(table(1, 2, 2, 2), 0.9);
    const upper = interval.ok ? interval.value.upper : 1;
    const probability = (risk: number): number => {
      const index = risk + upper;
      const none = (1 - index) ** 2 * (1 - (1 - risk) ** 2);
      return none + 2 * index * (1 - index) * risk ** 2;
    };
    const risks = Array.from({ length: 20_000 }, (_, step) => ((1 - upper) * step) / 20_000);
    expect(Math.max(...risks.map(probability))).toBeCloseTo(0.1, 7);
  });

  it('end at ±1 and at 0 where the counts do', () => {
    const apart = RISK_DIFFERENCE_INTERVALS.chanZhang.interval(table(5, 5, 0, 6), 0.95);
    expect(apart.ok && apart.value.upper).toBe(1);
    const none = RISK_RATIO_INTERVALS.chanZhang.interval(table(0, 5, 3, 6), 0.9);
    expect(none.ok && none.value.lower).toBe(0);
  });

  it('name what to use beyond the cap', () => {
    expect(RISK_RATIO_INTERVALS.chanZhang.interval(table(3, 501, 4, 7), 0.95)).toEqual({
      ok: false,
      issue: { code: 'tooLarge', facts: { cap: 500, instead: 'miettinenNurminen' } },
    });
  });
});

function term(trials: number, count: number, chance: number): number {
  let ways = 1;
  for (let step = 0; step < count; step += 1) ways *= (trials - step) / (step + 1);
  return ways * chance ** count * (1 - chance) ** (trials - count);
}
