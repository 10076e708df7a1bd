import { describe, expect, it } from 'vitest';
import {
  RISK_DIFFERENCE_HOMOGENEITIES,
  RISK_RATIO_HOMOGENEITIES,
  cochranArmitage,
  cochranMantelHaenszel,
  pearsonOfTable,
  pooledOddsRatio,
} from '#shared/stats';
import type { StratifiedTable, TestOutcome } from '#shared/stats';
import { valueOf } from './quantities';
import reference from './strata-and-trends.json';

type Case = (typeof reference.cases)[number];

describe('stratified tables against R', () => {
  it.each(casesOf('strata'))('$strata', (one) => {
    const strata: StratifiedTable = one.strata!.map(
      ([a = NaN, m = NaN, c = NaN, n = NaN], place) => ({
        id: `${place}`,
        table: { index: { events: a, total: m }, reference: { events: c, total: n } },
      }),
    );
    const { value, interval } = valueOf(pooledOddsRatio(strata, 0.95));
    expectAll([value, interval.lower, interval.upper], one.oddsRatio!);
    expectTest(valueOf(cochranMantelHaenszel(strata)), one.cochranMantelHaenszel!);
    const difference = RISK_DIFFERENCE_HOMOGENEITIES.inverseVariance.test(strata);
    expectTest(valueOf(difference.outcome), one.riskDifferenceQ!);
    const ratio = RISK_RATIO_HOMOGENEITIES.inverseVariance.test(strata);
    expectTest(valueOf(ratio.outcome), one.riskRatioQ!);
  });
});

describe('trends against R', () => {
  it.each(casesOf('trend'))('$events of $totals scored $scores', (one) => {
    const groups = one.events!.map((events, place) => ({
      events,
      total: one.totals![place]!,
      score: one.scores![place]!,
    }));
    expectTest(valueOf(cochranArmitage(groups)), one.trend!);
    const moved = groups.map((group) => ({ ...group, score: 7 - 3 * group.score }));
    expectTest(valueOf(cochranArmitage(moved)), one.trend!);
  });
});

describe('tables of any size against R', () => {
  it.each(casesOf('table'))('$counts', (one) => {
    const { statistic, degreesOfFreedom, pValue } = valueOf(
      pearsonOfTable({ counts: one.counts! }),
    );
    expectAll([Number(statistic), Number(degreesOfFreedom), pValue], one.pearson!);
  });
});

function casesOf(kind: string): readonly Case[] {
  const found = reference.cases.filter((one) => one.kind === kind);
  expect(found.length).toBeGreaterThan(3);
  return found;
}

function expectTest({ statistic, pValue }: TestOutcome, expected: readonly number[]): void {
  expectAll([Number(statistic), pValue], expected);
}

function expectAll(values: readonly number[], expected: readonly number[]): void {
  values.forEach((value, place) => {
    const wanted = expected[place]!;
    expect(Math.abs(value - wanted)).toBeLessThanOrEqual(1e-8 * Math.abs(wanted) + 1e-300);
  });
}
