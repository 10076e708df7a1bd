import { describe, expect, it } from 'vitest';
import {
  MATCHED_ODDS_RATIO_INTERVALS,
  PAIRED_DIFFERENCE_INTERVALS,
  PAIRED_TESTS,
  TREND_TESTS,
  adjustedResiduals,
  cramersV,
  fisherOfTable,
  likelihoodRatioOfTable,
} from '#shared/stats';
import type { PairedTable, TestOutcome } from '#shared/stats';
import { valueOf } from './quantities';
import reference from './tables-and-pairs.json';

type Case = (typeof reference.cases)[number];

/** Sums and closed forms. */
const DIRECT = 1e-9;
/** R's root finder stops at 1e-15 of a share, which the odds of a share near 1 enlarge. */
const ROOT = 1e-9;

describe('exact tests of tables against R', () => {
  it.each(casesOf('exactTable'))('$counts', (one) => {
    const counts = one.counts as number[][];
    expectAll([valueOf(fisherOfTable({ counts })).pValue], [one.fisher!], DIRECT);
    const turned = counts[0]!.map((_, column) => counts.map((row) => row[column]!));
    expectAll([valueOf(fisherOfTable({ counts: turned })).pValue], [one.fisher!], DIRECT);
  });
});

describe('tables of any size against R', () => {
  it.each(casesOf('table'))('$counts', (one) => {
    const table = { counts: one.counts as number[][] };
    const { statistic, degreesOfFreedom, pValue } = valueOf(likelihoodRatioOfTable(table));
    expectAll([Number(statistic), Number(degreesOfFreedom), pValue], one.likelihoodRatio!, DIRECT);
    const residuals = valueOf(adjustedResiduals(table));
    residuals.forEach((row, at) => {
      expectAll(row.map(Number), one.residuals![at]!, DIRECT);
    });
    expectAll([valueOf(cramersV(table))], [one.cramersV!], DIRECT);
  });
});

describe('trends against R', () => {
  it.each(casesOf('trend'))('$events of $totals scored $scores', (one) => {
    const groups = one.events!.map((events, at) => ({
      events,
      total: one.totals![at]!,
      score: one.scores![at]!,
    }));
    const { exactTrend, linearByLinear, cochranArmitage } = TREND_TESTS;
    const exact = valueOf(exactTrend.test(groups)).pValue;
    expectAll([exact], [one.exactTrend!], DIRECT);
    const moved = groups.map((group) => ({ ...group, score: 0.25 - 0.5 * group.score }));
    expectAll([valueOf(exactTrend.test(moved)).pValue], [one.exactTrend!], DIRECT);
    expectTest(valueOf(linearByLinear.test(groups)), one.linearByLinear!);
    expectTest(valueOf(cochranArmitage.test(groups)), one.cochranArmitage!);
  });
});

describe('pairs against R', () => {
  it.each(casesOf('pairs'))('$counts at $level', (one) => {
    const pairs = pairsOf(one.counts as number[]);
    const level = one.level!;
    expectTest(valueOf(PAIRED_TESTS.mcnemar.test(pairs)), one.mcnemar!);
    expectAll([valueOf(PAIRED_TESTS.mcnemarExact.test(pairs)).pValue], [one.mcnemarExact!], DIRECT);
    expectAll([valueOf(PAIRED_TESTS.mcnemarMidP.test(pairs)).pValue], [one.mcnemarMidP!], DIRECT);
    for (const id of ['newcombePaired', 'tango'] as const) {
      const { lower, upper } = valueOf(PAIRED_DIFFERENCE_INTERVALS[id].interval(pairs, level));
      expectAll([lower, upper], one[id]!, ROOT);
    }
    for (const method of Object.values(MATCHED_ODDS_RATIO_INTERVALS)) {
      const { lower, upper } = valueOf(method.interval(pairs, level));
      expectAll([lower, upper], one[method.id]!, ROOT);
    }
  });
});

function casesOf(kind: string): readonly Case[] {
  const found = reference.cases.filter((one) => one.kind === kind);
  expect(found.length).toBeGreaterThan(4);
  return found;
}

function pairsOf([both = 0, onlyFirst = 0, onlySecond = 0, neither = 0]: number[]): PairedTable {
  return { both, onlyFirst, onlySecond, neither };
}

function expectTest({ statistic, pValue }: TestOutcome, expected: readonly number[]): void {
  expectAll([Number(statistic), pValue], expected, DIRECT);
}

function expectAll(
  values: readonly number[],
  expected: readonly number[],
  relative: number,
): void {
  expect(values).toHaveLength(expected.length);
  values.forEach((value, place) => {
    const wanted = expected[place]!;
    const error = Math.abs(value - wanted);
    const most = relative * Math.abs(wanted) + 1e-11;
    expect(error, `${value} for ${wanted}`).toBeLessThanOrEqual(most);
  });
}
