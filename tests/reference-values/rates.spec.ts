import { describe, expect, it } from 'vitest';
import {
  RATE_DIFFERENCE_INTERVALS,
  RATE_INTERVALS,
  RATE_RATIO_INTERVALS,
  pooledRateDifference,
  pooledRateRatio,
  standardisedRate,
} from '#shared/stats';
import type { Estimate, Interval, RateCount, RateTable } from '#shared/stats';
import type { Result } from '#shared/core';
import { gammaQuantile, gammaUpperQuantile } from '../../shared/stats/distributions';
import { valueOf } from './quantities';
import reference from './rates.json';

type Case = (typeof reference.cases)[number];

/** R's root finder stops at 1e-15 of its argument; Poisson regression at 1e-14 of the deviance. */
const ROOT = 1e-7;
const DIRECT = 1e-9;

const PAIRS = {
  wald: [RATE_DIFFERENCE_INTERVALS.wald, DIRECT],
  miettinenNurminen: [RATE_DIFFERENCE_INTERVALS.miettinenNurminen, ROOT],
  waldLog: [RATE_RATIO_INTERVALS.waldLog, ROOT],
  exactConditional: [RATE_RATIO_INTERVALS.exactConditional, DIRECT],
  midPConditional: [RATE_RATIO_INTERVALS.midPConditional, ROOT],
  score: [RATE_RATIO_INTERVALS.score, DIRECT],
} as const;

describe('gamma quantiles against R', () => {
  it.each(casesOf('gamma'))('$probability of shape $shape', (one) => {
    const { probability, shape } = one;
    expectNear(gammaQuantile(probability!, shape!), one.quantile!, DIRECT);
    expectNear(gammaUpperQuantile(probability!, shape!), one.upperQuantile!, DIRECT);
  });
});

describe('one rate against R', () => {
  it.each(casesOf('rate'))('$count at $level', (one) => {
    expectLimits(RATE_INTERVALS.garwood.interval(countOf(one.count), one.level!), one.garwood!);
  });
});

describe('two rates against R', () => {
  it.each(casesOf('pair'))('$index against $reference at $level', (one) => {
    const table: RateTable = { index: countOf(one.index), reference: countOf(one.reference) };
    for (const [id, [method, tolerance]] of Object.entries(PAIRS)) {
      const expected = one[id as keyof typeof PAIRS];
      if (expected) {
        expectLimits(method.interval(table, one.level!), expected, tolerance);
      }
    }
  });

  it('are checked by every method, in most cases', () => {
    const methods = [RATE_DIFFERENCE_INTERVALS, RATE_RATIO_INTERVALS].flatMap(Object.keys);
    expect(Object.keys(PAIRS).toSorted()).toEqual(methods.toSorted());
    for (const id of methods) {
      const checked = casesOf('pair').filter((one) => one[id as keyof typeof PAIRS]);
      expect(checked.length, id).toBeGreaterThan(25);
    }
  });
});

describe('rates over strata against R', () => {
  it.each(casesOf('strata'))('$strata', (one) => {
    const strata = one.strata!.map(([a, s, c, t], place) => ({
      id: `${place}`,
      table: { index: countOf([a!, s!]), reference: countOf([c!, t!]) },
    }));
    expectEstimate(pooledRateRatio(strata, 0.95), one.pooledRatio!);
    expectEstimate(pooledRateDifference(strata, 0.95), one.pooledDifference!);
  });
});

describe('standardised rates against R', () => {
  it.each(casesOf('standardised'))('$events in $times weighted $weights', (one) => {
    const strata = one.events!.map((events, place) => ({
      id: `${place}`,
      count: { events, time: one.times![place]! },
      weight: one.weights![place]!,
    }));
    expectEstimate(standardisedRate(strata, one.level!), one.fayFeuer!);
  });
});

function casesOf(kind: string): readonly Case[] {
  const found = reference.cases.filter((one) => one.kind === kind);
  expect(found.length).toBeGreaterThan(3);
  return found;
}

function countOf([events = NaN, time = NaN]: readonly number[] = []): RateCount {
  return { events, time };
}

function expectEstimate(result: Result<Estimate, unknown>, expected: readonly number[]): void {
  const { value, interval } = valueOf(result);
  [value, interval.lower, interval.upper].forEach((each, place) => {
    expectNear(each, expected[place]!, DIRECT);
  });
}

function expectLimits(
  result: Result<Interval, unknown>,
  [lower = NaN, upper = NaN]: readonly number[],
  relative = DIRECT,
): void {
  const interval = valueOf(result);
  expectNear(interval.lower, lower, relative);
  expectNear(interval.upper, upper, relative);
}

function expectNear(value: number, expected: number, relative: number): void {
  expect(Math.abs(value - expected)).toBeLessThanOrEqual(relative * Math.abs(expected) + 1e-15);
}
