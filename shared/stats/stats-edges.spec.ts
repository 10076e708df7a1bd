import { describe, expect, it } from 'vitest';
import { productDifference } from './exact';
import { RISK_DIFFERENCE_INTERVALS, RISK_INTERVALS, RISK_RATIO_INTERVALS } from './intervals';
import { zeroOfDecreasing } from './intervals/score/bisection';
import {
  ODDS_RATIO_HOMOGENEITIES,
  RISK_DIFFERENCE_HOMOGENEITIES,
  RISK_RATIO_HOMOGENEITIES,
  cochranMantelHaenszel,
  pooledOddsRatio,
  pooledRiskDifference,
  pooledRiskRatio,
} from './stratified';
import { pearsonOfTable } from './tests-of-association';
import { cochranArmitage } from './trend';

const stratum = (id: string, a: number, m: number, c: number, n: number) => ({
  id,
  table: { index: { events: a, total: m }, reference: { events: c, total: n } },
});

describe('productDifference', () => {
  it('keeps a difference of one between products beyond 2^53', () => {
    expect(productDifference(94906267, 94906267, 94906266, 94906268)).toBe(1);
    expect(94906267 * 94906267 - 94906266 * 94906268).not.toBe(1);
  });
});

describe('zeroOfDecreasing', () => {
  it('finds the zero to the last bit, or gives the end beyond which it lies', () => {
    expect(zeroOfDecreasing((x) => 0.1 - x, 0, 1)).toBeCloseTo(0.1, 15);
    expect(zeroOfDecreasing(() => -1, 2, 5)).toBe(2);
    expect(zeroOfDecreasing(() => 1, 2, 5)).toBe(5);
  });
});

describe('intervals at the ends', () => {
  it.each(Object.values(RISK_INTERVALS))('$label touches 0 and 1', (method) => {
    const none = method.interval({ events: 0, total: 20 }, 0.95);
    const all = method.interval({ events: 20, total: 20 }, 0.95);
    expect(none.ok && none.value.lower).toBe(0);
    expect(all.ok && all.value.upper).toBe(1);
  });

  it('two groups without events still give a difference, never a ratio', () => {
    const { table } = stratum('x', 0, 10, 0, 20);
    const newcombe = RISK_DIFFERENCE_INTERVALS.newcombe.interval(table, 0.95);
    expect(newcombe.ok && newcombe.value.lower).toBeLessThan(-0.1);
    const wald = RISK_DIFFERENCE_INTERVALS.wald.interval(table, 0.95);
    expect(wald.ok && wald.value.upper - wald.value.lower).toBe(0);
    for (const method of Object.values(RISK_RATIO_INTERVALS)) {
      expect(method.interval(table, 0.95)).toMatchObject({ issue: { code: 'zeroCell' } });
    }
  });

  it('score intervals end at ±1 where the groups are apart altogether', () => {
    const { table } = stratum('x', 10, 10, 0, 10);
    const { miettinenNurminen } = RISK_DIFFERENCE_INTERVALS;
    const apart = miettinenNurminen.interval(table, 0.95);
    expect(apart.ok && apart.value.upper).toBe(1);
    expect(apart.ok && apart.value.lower).toBeGreaterThan(0.5);
  });

  it('a ratio of 0 has a score interval from 0 but no log interval', () => {
    const { table } = stratum('x', 0, 16, 15, 72);
    const koopman = RISK_RATIO_INTERVALS.koopman.interval(table, 0.95);
    expect(koopman.ok && koopman.value.lower).toBe(0);
    expect(RISK_RATIO_INTERVALS.katz.interval(table, 0.95).ok).toBe(false);
  });
});

describe('pooling at the ends', () => {
  it('a pooled ratio of 0 or infinity is no estimate', () => {
    const none = [stratum('a', 0, 10, 4, 10), stratum('b', 0, 12, 5, 12)];
    const infinite = [stratum('a', 4, 10, 0, 10), stratum('b', 5, 12, 0, 12)];
    for (const strata of [none, infinite]) {
      expect(pooledRiskRatio(strata, 0.95)).toMatchObject({ issue: { code: 'zeroCell' } });
      expect(pooledOddsRatio(strata, 0.95)).toMatchObject({ issue: { code: 'zeroCell' } });
      expect(pooledRiskDifference(strata, 0.95).ok).toBe(true);
      expect(ODDS_RATIO_HOMOGENEITIES.breslowDayTarone.test(strata).outcome).toMatchObject({
        issue: { code: 'zeroCell' },
      });
    }
  });

  it('homogeneity names the strata that it cannot use', () => {
    const strata = [
      stratum('plain', 3, 10, 4, 10),
      stratum('empty', 0, 0, 5, 12),
      stratum('apart', 6, 6, 0, 9),
      stratum('without', 0, 8, 0, 9),
    ];
    const difference = RISK_DIFFERENCE_HOMOGENEITIES.inverseVariance.test(strata);
    expect(difference.leftOut.map(({ stratumId, issue }) => [stratumId, issue.code])).toEqual([
      ['empty', 'emptyGroup'],
      ['apart', 'zeroCell'],
      ['without', 'zeroCell'],
    ]);
    expect(difference.outcome).toMatchObject({ issue: { code: 'fewerThanTwoStrata' } });
    expect(RISK_RATIO_HOMOGENEITIES.inverseVariance.test(strata).outcome).toMatchObject({
      issue: { code: 'fewerThanTwoStrata' },
    });
    expect(
      ODDS_RATIO_HOMOGENEITIES.breslowDayTarone.test(strata).leftOut.map(({ issue }) => issue.code),
    ).toEqual(['emptyGroup', 'emptyMargin']);
  });

  it('takes impossible counts for an error, not for a stratum to leave out', () => {
    const strata = [stratum('a', 4, 10, 3, 10), stratum('b', 12, 10, 3, 10)];
    const invalid = { ok: false, issue: { code: 'invalidCounts' } };
    expect(pooledRiskDifference(strata, 0.95)).toMatchObject(invalid);
    expect(pooledOddsRatio(strata, 0.95)).toMatchObject(invalid);
    expect(cochranMantelHaenszel(strata)).toMatchObject(invalid);
    expect(RISK_DIFFERENCE_HOMOGENEITIES.inverseVariance.test(strata).outcome).toMatchObject(
      invalid,
    );
    expect(pooledRiskDifference(strata.slice(0, 1), 1)).toMatchObject({
      issue: { code: 'invalidLevel' },
    });
  });

  it('the corrected test does not square a negative remainder', () => {
    const strata = [stratum('a', 5, 10, 5, 10), stratum('b', 4, 8, 4, 8)];
    expect(cochranMantelHaenszel(strata, 'half')).toMatchObject({
      value: { statistic: 0, pValue: 1 },
    });
  });
});

describe('tests that are not defined', () => {
  it('of a table with one row or one column, or broken counts', () => {
    const code = (counts: number[][]): unknown => {
      const outcome = pearsonOfTable({ counts });
      return outcome.ok ? null : outcome.issue.code;
    };
    expect(
      code([
        [3, 4],
        [0, 0],
      ]),
    ).toBe('fewerThanTwoLevels');
    expect(
      code([
        [3, 0],
        [4, 0],
      ]),
    ).toBe('emptyMargin');
    expect(
      code([
        [3, -1],
        [4, 2],
      ]),
    ).toBe('invalidCounts');
    expect(code([])).toBe('fewerThanTwoLevels');
  });

  it('of a trend over one score, without events, or with scores that are no numbers', () => {
    const code = (scores: number[], events: number): unknown => {
      const outcome = cochranArmitage(scores.map((score) => ({ events, total: 10, score })));
      return outcome.ok ? null : outcome.issue.code;
    };
    expect(code([1, 1, 1], 3)).toBe('fewerThanTwoLevels');
    expect(code([1, 2, 3], 0)).toBe('emptyMargin');
    expect(code([1, 2, 3], 10)).toBe('emptyMargin');
    expect(code([1, NaN], 3)).toBe('invalidCounts');
  });
});
