import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  RATE_DIFFERENCE_INTERVALS,
  RATE_INTERVALS,
  RATE_RATIO_INTERVALS,
  RATE_STANDARDISATION,
  pooledRateDifference,
  pooledRateRatio,
  rateDifferenceOf,
  rateOf,
  rateRatioOf,
  standardisedRate,
} from '#shared/stats';
import type { Estimate, Interval, IntervalMethod, RateCount, RateTable } from '#shared/stats';
import type { Result } from '#shared/core';

const SEEDED = { seed: 20251201, numRuns: 200 } as const;

const count: fc.Arbitrary<RateCount> = fc.record({
  events: fc.oneof(fc.integer({ min: 0, max: 6 }), fc.integer({ min: 0, max: 20_000 })),
  time: fc.oneof(fc.double({ min: 0.5, max: 900, noNaN: true }), fc.integer({ min: 1, max: 5e7 })),
});
const filled = count.filter(({ events }) => events > 0);
const table: fc.Arbitrary<RateTable> = fc.record({ index: count, reference: count });
const filledTable: fc.Arbitrary<RateTable> = fc.record({ index: filled, reference: filled });
const level = fc.constantFrom(0.8, 0.9, 0.95, 0.99);

describe.each(Object.values(RATE_INTERVALS))('$label for a rate', (method) => {
  it('holds the rate, widens with the level, and follows the unit of time', () => {
    property(count, (one, chosen) => {
      const { lower, upper } = limitsOf(method.interval(one, chosen));
      expect(lower).toBeLessThanOrEqual(rateOf(one));
      expect(upper).toBeGreaterThanOrEqual(rateOf(one));
      const wide = limitsOf(method.interval(one, 1 - (1 - chosen) / 3));
      expect(wide.lower).toBeLessThanOrEqual(lower);
      expect(wide.upper).toBeGreaterThan(upper);
      const inDays = limitsOf(method.interval({ ...one, time: one.time * 365 }, chosen));
      expectNear(inDays.upper * 365, upper);
      expectNear(inDays.lower * 365, lower);
    });
  });

  it('grows with the events', () => {
    property(count, (one, chosen) => {
      const more = limitsOf(method.interval({ ...one, events: one.events + 1 }, chosen));
      const limits = limitsOf(method.interval(one, chosen));
      expect(more.lower).toBeGreaterThan(limits.lower);
      expect(more.upper).toBeGreaterThan(limits.upper);
    });
  });
});

describe.each(Object.values(RATE_DIFFERENCE_INTERVALS))(
  '$label for a rate difference',
  (method) => {
    lawsOfContrast(method, filledTable, rateDifferenceOf, (limit) => -limit, 1);
  },
);

describe.each(Object.values(RATE_RATIO_INTERVALS))('$label for a rate ratio', (method) => {
  lawsOfContrast(method, filledTable, rateRatioOf, (limit) => 1 / limit, 0);
});

describe('groups without events', () => {
  const none: RateTable = { index: { events: 0, time: 40 }, reference: { events: 0, time: 90 } };
  const some: RateTable = { ...none, reference: { events: 3, time: 90 } };

  it('in both: no width by Wald, so no estimate; the score interval stands', () => {
    expect(codeOf(RATE_DIFFERENCE_INTERVALS.wald.interval(none, 0.95))).toBe('noEvents');
    const { lower, upper } = limitsOf(
      RATE_DIFFERENCE_INTERVALS.miettinenNurminen.interval(none, 0.95),
    );
    const square = 1.959963984540054 ** 2;
    expectNear(upper, square / 40);
    expectNear(lower, -square / 90);
    for (const method of Object.values(RATE_RATIO_INTERVALS)) {
      expect(codeOf(method.interval(none, 0.95))).toBe('noEvents');
    }
  });

  it('in one: a ratio of 0 has an upper limit, an infinite one has none', () => {
    expect(codeOf(RATE_RATIO_INTERVALS.waldLog.interval(some, 0.95))).toBe('zeroCell');
    const { exactConditional, midPConditional, score } = RATE_RATIO_INTERVALS;
    for (const method of [exactConditional, midPConditional, score]) {
      expect(limitsOf(method.interval(some, 0.95)).lower).toBe(0);
      const turned = { index: some.reference, reference: some.index };
      expect(codeOf(method.interval(turned, 0.95))).toBe('zeroCell');
    }
  });
});

describe('duality of the exact and the mid-p ratio with the binomial split', () => {
  it('puts half the error in each tail', () => {
    property(fc.record({ index: small(), reference: small() }), (one, chosen) => {
      const { lower } = limitsOf(RATE_RATIO_INTERVALS.exactConditional.interval(one, chosen));
      const share = shareAt(one, lower);
      expectNear(tailFrom(one, share, 1), (1 - chosen) / 2, 1e-6);
      const middle = limitsOf(RATE_RATIO_INTERVALS.midPConditional.interval(one, chosen)).lower;
      expectNear(tailFrom(one, shareAt(one, middle), 0.5), (1 - chosen) / 2, 1e-6);
      expect(middle).toBeGreaterThanOrEqual(lower);
    });
  });
});

describe('pooled rates', () => {
  it('over one stratum are the unpooled rates with their Wald limits', () => {
    property(filledTable, (one, chosen) => {
      const strata = [{ id: 'only', table: one }];
      const ratio = estimateOf(pooledRateRatio(strata, chosen));
      expectNear(ratio.value, rateRatioOf(one));
      expectLimits(ratio.interval, RATE_RATIO_INTERVALS.waldLog.interval(one, chosen));
      const difference = estimateOf(pooledRateDifference(strata, chosen));
      const scale = rateOf(one.index) + rateOf(one.reference);
      expect(Math.abs(difference.value - rateDifferenceOf(one))).toBeLessThan(1e-12 * scale);
    });
  });

  it('of strata that are all alike are those of one stratum', () => {
    property(filledTable, (one, chosen) => {
      const strata = ['a', 'b', 'c'].map((id) => ({ id, table: one }));
      expectNear(estimateOf(pooledRateRatio(strata, chosen)).value, rateRatioOf(one));
    });
  });

  it('turn round with the groups and leave out strata that tell nothing', () => {
    const empty = { index: { events: 0, time: 0 }, reference: { events: 4, time: 60 } };
    property(fc.array(filledTable, { minLength: 2, maxLength: 6 }), (tables, chosen) => {
      const strata = [...tables, empty].map((one, place) => ({ id: `${place}`, table: one }));
      const turned = strata.map(({ id, table: one }) => ({
        id,
        table: { index: one.reference, reference: one.index },
      }));
      const straight = estimateOf(pooledRateRatio(strata, chosen));
      const back = estimateOf(pooledRateRatio(turned, chosen));
      expectNear(1 / back.value, straight.value);
      expectNear(1 / back.interval.upper, straight.interval.lower);
      const withoutEmpty = estimateOf(pooledRateRatio(strata.slice(0, -1), chosen));
      expect(withoutEmpty).toEqual(straight);
    });
  });

  it('say why there are none', () => {
    const none = { index: { events: 0, time: 5 }, reference: { events: 0, time: 7 } };
    const wrong = { index: { events: 1.5, time: 5 }, reference: { events: 0, time: 7 } };
    expect(codeOf(pooledRateRatio([], 0.95))).toBe('noInformativeStratum');
    expect(codeOf(pooledRateRatio([{ id: 'a', table: none }], 0.95))).toBe('noInformativeStratum');
    expect(codeOf(pooledRateDifference([{ id: 'a', table: none }], 0.95))).toBe('noEvents');
    expect(codeOf(pooledRateRatio([{ id: 'a', table: wrong }], 0.95))).toBe('invalidCounts');
    expect(codeOf(pooledRateRatio([{ id: 'a', table: none }], 95))).toBe('invalidLevel');
  });
});

describe('standardised rates', () => {
  const stratum = fc.record({
    id: fc.constant('s'),
    count,
    weight: fc.integer({ min: 1, max: 90 }),
  });

  it('over one stratum are its rate with the exact Poisson limits', () => {
    property(stratum, (one, chosen) => {
      const { value, interval } = estimateOf(standardisedRate([one], chosen));
      expectNear(value, rateOf(one.count));
      expectLimits(interval, RATE_INTERVALS.garwood.interval(one.count, chosen));
      expect(RATE_STANDARDISATION).toHaveProperty(interval.method);
    });
  });

  it('hold the estimate and do not mind the unit of the weights', () => {
    property(fc.array(stratum, { minLength: 2, maxLength: 8 }), (strata, chosen) => {
      const { value, interval } = estimateOf(standardisedRate(strata, chosen));
      expect(interval.lower).toBeLessThanOrEqual(value);
      expect(interval.upper).toBeGreaterThanOrEqual(value);
      const shares = strata.map((one) => ({ ...one, weight: one.weight / 1000 }));
      expectNear(estimateOf(standardisedRate(shares, chosen)).interval.upper, interval.upper);
    });
  });

  it('refuse a weighted stratum without person-time by its name', () => {
    const strata = [
      { id: 'young', count: { events: 2, time: 90 }, weight: 3 },
      { id: 'old', count: { events: 0, time: 0 }, weight: 1 },
    ];
    expect(standardisedRate(strata, 0.95)).toMatchObject({
      ok: false,
      issue: { code: 'emptyGroup', facts: { stratum: 'old' } },
    });
    const unweighted = strata.map((one) => (one.id === 'old' ? { ...one, weight: 0 } : one));
    expect(standardisedRate(unweighted, 0.95).ok).toBe(true);
    expect(codeOf(standardisedRate([], 0.95))).toBe('noInformativeStratum');
  });
});

function lawsOfContrast(
  method: IntervalMethod<RateTable>,
  tables: fc.Arbitrary<RateTable>,
  value: (one: RateTable) => number,
  mirror: (limit: number) => number,
  timePower: number,
): void {
  it('holds the estimate and widens with the level', () => {
    property(tables, (one, chosen) => {
      const { lower, upper } = limitsOf(method.interval(one, chosen));
      const slack = 1e-12 * Math.max(Math.abs(lower), Math.abs(upper));
      expect(lower).toBeLessThanOrEqual(value(one) + slack);
      expect(upper).toBeGreaterThanOrEqual(value(one) - slack);
      const wide = limitsOf(method.interval(one, 1 - (1 - chosen) / 3));
      expect(wide.lower).toBeLessThanOrEqual(lower + slack);
      expect(wide.upper).toBeGreaterThanOrEqual(upper - slack);
    });
  });

  it('mirrors when the groups change places', () => {
    property(tables, (one, chosen) => {
      const { lower, upper } = limitsOf(method.interval(one, chosen));
      const turned = { index: one.reference, reference: one.index };
      const back = limitsOf(method.interval(turned, chosen));
      const scale = Math.max(Math.abs(lower), Math.abs(upper));
      expect(Math.abs(mirror(back.upper) - lower)).toBeLessThan(1e-9 * scale);
      expect(Math.abs(mirror(back.lower) - upper)).toBeLessThan(1e-9 * scale);
    });
  });

  it('follows the unit of time', () => {
    property(tables, (one, chosen) => {
      const { lower, upper } = limitsOf(method.interval(one, chosen));
      const inDays = limitsOf(
        method.interval({ index: days(one.index), reference: days(one.reference) }, chosen),
      );
      const scale = 1e-9 * Math.max(Math.abs(lower), Math.abs(upper));
      expect(Math.abs(inDays.lower * 365 ** timePower - lower)).toBeLessThan(scale);
      expect(Math.abs(inDays.upper * 365 ** timePower - upper)).toBeLessThan(scale);
    });
  });

  it('refuses counts that cannot be, no person-time and a level that cannot be', () => {
    const one = fc.sample(tables, 1)[0]!;
    const with_ = (index: RateCount) => method.interval({ ...one, index }, 0.95);
    expect(codeOf(with_({ events: -1, time: 4 }))).toBe('invalidCounts');
    expect(codeOf(with_({ events: 2, time: 0 }))).toBe('invalidCounts');
    expect(codeOf(with_({ events: 0, time: 0 }))).toBe('emptyGroup');
    expect(codeOf(with_({ events: 2, time: NaN }))).toBe('invalidCounts');
    expect(codeOf(method.interval(one, 95))).toBe('invalidLevel');
  });

  it('is defined for every table or says why not', () => {
    property(table, (any, chosen) => {
      const result = method.interval(any, chosen);
      expect(result.ok || ['noEvents', 'zeroCell'].includes(result.issue.code)).toBe(true);
    });
  });
}

function days({ events, time }: RateCount): RateCount {
  return { events, time: time * 365 };
}

function small(): fc.Arbitrary<RateCount> {
  return fc.record({
    events: fc.integer({ min: 1, max: 25 }),
    time: fc.integer({ min: 1, max: 500 }),
  });
}

/** The chance that an event falls into the index group where the rate ratio is given. */
function shareAt({ index, reference }: RateTable, ratio: number): number {
  return (ratio * index.time) / (ratio * index.time + reference.time);
}

/** P(X > x) + weight P(X = x), summed term by term. */
function tailFrom({ index, reference }: RateTable, share: number, weight: number): number {
  const total = index.events + reference.events;
  let sum = 0;
  for (let x = index.events; x <= total; x += 1) {
    sum += (x === index.events ? weight : 1) * binomialTerm(x, total, share);
  }
  return sum;
}

function binomialTerm(x: number, total: number, share: number): number {
  let term = 1;
  for (let place = 1; place <= x; place += 1) {
    term *= ((total - x + place) / place) * share;
  }
  return term * (1 - share) ** (total - x);
}

function property<T>(values: fc.Arbitrary<T>, law: (value: T, chosen: number) => void): void {
  fc.assert(fc.property(values, level, law), SEEDED);
}

function limitsOf(result: Result<Interval, unknown>): Interval {
  if (!result.ok) {
    throw new Error(JSON.stringify(result.issue));
  }
  return result.value;
}

function estimateOf(result: Result<Estimate, unknown>): Estimate {
  if (!result.ok) {
    throw new Error(JSON.stringify(result.issue));
  }
  return result.value;
}

function codeOf(result: Result<unknown, { readonly code: string }>): string | null {
  return result.ok ? null : result.issue.code;
}

function expectLimits(interval: Interval, expected: Result<Interval, unknown>): void {
  const { lower, upper } = limitsOf(expected);
  expectNear(interval.lower, lower);
  expectNear(interval.upper, upper);
}

function expectNear(value: number, expected: number, relative = 1e-9): void {
  expect(Math.abs(value - expected)).toBeLessThanOrEqual(relative * Math.abs(expected) + 1e-300);
}
