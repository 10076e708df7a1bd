import { describe, expect, it } from 'vitest';
import {
  ODDS_RATIO_INTERVALS,
  RISK_DIFFERENCE_INTERVALS,
  RISK_INTERVALS,
  RISK_RATIO_INTERVALS,
  fisherOfFourfold,
  pearsonOfFourfold,
} from '#shared/stats';
import type { FourfoldTable, GroupCount, Interval } from '#shared/stats';
import type { Result } from '#shared/core';
import reference from './fourfold.json';
import { valueOf } from './quantities';

interface RiskLimits {
  readonly wilson: readonly number[];
  readonly clopperPearson: readonly number[];
}

/** The R script's iterated fits stop at 1e-14 of the deviance, which is 1e-7 of a limit. */
const FITTED = 1e-6;
const DIRECT = 1e-9;

describe('fourfold tables against R', () => {
  it.each(reference.cases)('$index against $reference at $level', (one) => {
    const table: FourfoldTable = { index: group(one.index), reference: group(one.reference) };
    expectRisk(table.index, one.level, one.indexRisk);
    expectRisk(table.reference, one.level, one.referenceRisk);
    if (one.wald) {
      const { level } = one;
      const wald = RISK_DIFFERENCE_INTERVALS.wald.interval(table, level);
      expectLimits(wald, clamped(one.wald), FITTED);
      expectLimits(RISK_RATIO_INTERVALS.katz.interval(table, level), one.katz, FITTED);
      expectLimits(ODDS_RATIO_INTERVALS.woolf.interval(table, level), one.woolf, FITTED);
    }
    if (one.pearson) {
      const { statistic, pValue } = valueOf(pearsonOfFourfold(table));
      expectNear(Number(statistic), one.pearson[0]!, DIRECT);
      expectNear(pValue, one.pearson[1]!, DIRECT);
    }
    if (one.fisher !== undefined) {
      expectNear(valueOf(fisherOfFourfold(table)).pValue, one.fisher, 1e-8);
    }
  });

  it('holds tables with zero cells, ties and a million people', () => {
    expect(reference.cases.some(({ index }) => index[0] === 0)).toBe(true);
    expect(reference.cases.some(({ index }) => index[1]! >= 1e6)).toBe(true);
    expect(reference.cases.filter((one) => one.woolf).length).toBeGreaterThan(25);
  });
});

function group([events = NaN, total = NaN]: readonly number[]): GroupCount {
  return { events, total };
}

function expectRisk(count: GroupCount, level: number, limits: RiskLimits): void {
  expectLimits(RISK_INTERVALS.wilson.interval(count, level), limits.wilson, DIRECT);
  expectLimits(RISK_INTERVALS.clopperPearson.interval(count, level), limits.clopperPearson, DIRECT);
}

/** R leaves a difference's limits where they fall; here they are cut to [-1, 1]. */
function clamped([lower = NaN, upper = NaN]: readonly number[]): readonly number[] {
  return [Math.max(-1, lower), Math.min(1, upper)];
}

function expectLimits(
  result: Result<Interval, unknown>,
  [lower = NaN, upper = NaN]: readonly number[],
  relative: number,
): void {
  const interval = valueOf(result);
  expectNear(interval.lower, lower, relative);
  expectNear(interval.upper, upper, relative);
}

function expectNear(value: number, expected: number, relative: number): void {
  expect(Math.abs(value - expected)).toBeLessThanOrEqual(relative * Math.abs(expected) + 1e-12);
}
