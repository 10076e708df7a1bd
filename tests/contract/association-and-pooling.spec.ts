import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  ODDS_RATIO_HOMOGENEITIES,
  RISK_DIFFERENCE_HOMOGENEITIES,
  RISK_RATIO_HOMOGENEITIES,
  cochranArmitage,
  cochranMantelHaenszel,
  fisherOfFourfold,
  marginsOf,
  oddsRatioOf,
  pearsonOfFourfold,
  pearsonOfTable,
  pooledOddsRatio,
  pooledRiskDifference,
  pooledRiskRatio,
  riskDifferenceOf,
  riskRatioOf,
} from '#shared/stats';
import type { Estimate, FourfoldTable, StratifiedTable, TestOutcome } from '#shared/stats';
import type { Result } from '#shared/core';
import {
  SEEDED,
  filledFourfold,
  filledStrata,
  fourfold,
  groups,
  level,
  swapGroups,
  swapOutcome,
} from './fourfold-arbitraries';

const smallFourfold = fc.record({ index: groups(60), reference: groups(60) });

describe('tests of association', () => {
  it.each([
    ['Pearson', pearsonOfFourfold],
    ['Fisher', fisherOfFourfold],
  ])('%s: same p when groups or outcomes change places, from 0 to 1', (_name, test) => {
    fc.assert(
      fc.property(fourfold, (table) => {
        const outcome = test(table);
        if (!outcome.ok) {
          expect(outcome.issue.code).toBe('emptyMargin');
          return;
        }
        const { pValue } = outcome.value;
        expect(pValue).toBeGreaterThanOrEqual(0);
        expect(pValue).toBeLessThanOrEqual(1);
        expectNear(valueOf(test(swapGroups(table))).pValue, pValue);
        expectNear(valueOf(test(swapOutcome(table))).pValue, pValue);
        expectNear(valueOf(test(transposed(table))).pValue, pValue);
      }),
      SEEDED,
    );
  });

  it('Fisher agrees with exact enumeration by whole numbers', () => {
    fc.assert(
      fc.property(smallFourfold, (table) => {
        const outcome = fisherOfFourfold(table);
        if (outcome.ok) {
          expectNear(outcome.value.pValue, enumerated(table));
        }
      }),
      { ...SEEDED, numRuns: 1000 },
    );
  });

  it('Pearson of a fourfold table is Pearson of the table, and grows with its size', () => {
    fc.assert(
      fc.property(filledFourfold, fc.integer({ min: 2, max: 50 }), (table, times) => {
        const { statistic } = valueOf(pearsonOfFourfold(table));
        const ofTable = valueOf(pearsonOfTable({ counts: rowsOf(table) }));
        expectNear(Number(ofTable.statistic), Number(statistic));
        const larger = valueOf(pearsonOfFourfold(timesAll(table, times)));
        expectNear(Number(larger.statistic), Number(statistic) * times);
      }),
      SEEDED,
    );
  });

  it('Pearson passes over empty rows and columns', () => {
    const plain = valueOf(
      pearsonOfTable({
        counts: [
          [10, 20],
          [5, 30],
        ],
      }),
    );
    const padded = pearsonOfTable({
      counts: [
        [10, 0, 20],
        [0, 0, 0],
        [5, 0, 30],
      ],
    });
    expect(valueOf(padded)).toEqual(plain);
  });

  it('a trend over two groups is Pearson; scores may be moved and scaled', () => {
    fc.assert(
      fc.property(filledFourfold, fc.double({ min: 0.1, max: 9, noNaN: true }), (table, scale) => {
        const trend = cochranArmitage([
          { ...table.reference, score: 3 },
          { ...table.index, score: 3 + scale },
        ]);
        const { statistic, pValue } = valueOf(pearsonOfFourfold(table));
        expectNear(Number(valueOf(trend).statistic), Number(statistic));
        expectNear(valueOf(trend).pValue, pValue);
      }),
      SEEDED,
    );
  });
});

interface Pooling {
  readonly name: string;
  readonly value: (table: FourfoldTable) => number;
  readonly pooled: (strata: StratifiedTable, level: number) => Result<Estimate, unknown>;
  readonly mirror: (limit: number) => number;
}

const POOLINGS: readonly Pooling[] = [
  {
    name: 'risk difference (Sato)',
    value: riskDifferenceOf,
    pooled: (strata, chosen) => pooledRiskDifference(strata, chosen, 'sato'),
    mirror: (limit) => 0 - limit,
  },
  {
    name: 'risk difference (Greenland and Robins)',
    value: riskDifferenceOf,
    pooled: (strata, chosen) => pooledRiskDifference(strata, chosen, 'greenlandRobins'),
    mirror: (limit) => 0 - limit,
  },
  {
    name: 'risk ratio',
    value: riskRatioOf,
    pooled: pooledRiskRatio,
    mirror: (limit) => 1 / limit,
  },
  {
    name: 'odds ratio',
    value: oddsRatioOf,
    pooled: pooledOddsRatio,
    mirror: (limit) => 1 / limit,
  },
];

describe.each(POOLINGS)('Mantel–Haenszel $name', ({ value, pooled, mirror }) => {
  it('is the crude estimate for one stratum and lies between the strata for several', () => {
    fc.assert(
      fc.property(filledStrata, (strata) => {
        const [first] = strata;
        expectNear(valueOf(pooled([first!], 0.95)).value, value(first!.table));
        const values = strata.map(({ table }) => value(table));
        const { value: together } = valueOf(pooled(strata, 0.95));
        expect(together).toBeGreaterThanOrEqual(Math.min(...values) - 1e-9);
        expect(together).toBeLessThanOrEqual(Math.max(...values) * (1 + 1e-9) + 1e-9);
      }),
      SEEDED,
    );
  });

  it('mirrors when the groups change places, and widens with the level', () => {
    fc.assert(
      fc.property(filledStrata, level, (strata, chosen) => {
        const straight = valueOf(pooled(strata, chosen));
        const turned = valueOf(pooled(strataOf(strata, swapGroups), chosen));
        expectNear(mirror(turned.value), straight.value);
        expectNear(mirror(turned.interval.lower), straight.interval.upper);
        expectNear(mirror(turned.interval.upper), straight.interval.lower);
        const wide = valueOf(pooled(strata, 1 - (1 - chosen) / 2));
        expect(wide.interval.lower).toBeLessThanOrEqual(straight.interval.lower);
        expect(wide.interval.upper).toBeGreaterThanOrEqual(straight.interval.upper);
      }),
      SEEDED,
    );
  });

  it('does not see strata with an empty group, and refuses when there are only such', () => {
    fc.assert(
      fc.property(filledStrata, (strata) => {
        const empty = { index: { events: 0, total: 0 }, reference: { events: 4, total: 9 } };
        const padded = [...strata, { id: 'empty', table: empty }];
        expect(pooled(padded, 0.95)).toEqual(pooled(strata, 0.95));
        expect(pooled([{ id: 'empty', table: empty }], 0.95)).toMatchObject({
          ok: false,
          issue: { code: 'noInformativeStratum' },
        });
      }),
      SEEDED,
    );
  });
});

describe('stratified tests', () => {
  it('one stratum: CMH is Pearson times (N - 1) / N', () => {
    fc.assert(
      fc.property(filledFourfold, (table) => {
        const { total } = marginsOf(table);
        const pearson = Number(valueOf(pearsonOfFourfold(table)).statistic);
        const stratified = valueOf(cochranMantelHaenszel([{ id: 'one', table }]));
        expectNear(Number(stratified.statistic), (pearson * (total - 1)) / total);
      }),
      SEEDED,
    );
  });

  it.each([
    ['odds ratio (Breslow–Day–Tarone)', ODDS_RATIO_HOMOGENEITIES.breslowDayTarone],
    ['odds ratio (Breslow–Day)', ODDS_RATIO_HOMOGENEITIES.breslowDay],
    ['odds ratio (Woolf)', ODDS_RATIO_HOMOGENEITIES.woolf],
    ['risk difference', RISK_DIFFERENCE_HOMOGENEITIES.inverseVariance],
    ['risk ratio', RISK_RATIO_HOMOGENEITIES.inverseVariance],
  ])('homogeneity of the %s: nothing between copies of one stratum', (_name, method) => {
    fc.assert(
      fc.property(filledFourfold, fc.integer({ min: 2, max: 6 }), (table, copies) => {
        const strata = Array.from({ length: copies }, (_, place) => ({
          id: `${place}`,
          table: timesAll(table, place + 1),
        }));
        const outcome: TestOutcome = valueOf(method.test(strata).outcome);
        expect(outcome.degreesOfFreedom).toBe(copies - 1);
        expect(Number(outcome.statistic)).toBeLessThan(1e-6);
        expect(outcome.pValue).toBeGreaterThan(0.99);
      }),
      SEEDED,
    );
  });

  it('homogeneity of the odds ratio does not change when groups or outcomes change places', () => {
    fc.assert(
      fc.property(filledStrata, (strata) => {
        const statisticOf = (tables: StratifiedTable): number =>
          Number(valueOf(ODDS_RATIO_HOMOGENEITIES.breslowDayTarone.test(tables).outcome).statistic);
        const statistic = statisticOf(strata);
        expectNear(statisticOf(strataOf(strata, swapGroups)), statistic);
        expectNear(statisticOf(strataOf(strata, swapOutcome)), statistic);
      }),
      SEEDED,
    );
  });

  it('splitting a stratum into proportional copies leaves the odds ratio as it is', () => {
    fc.assert(
      fc.property(filledFourfold, filledFourfold, (first, second) => {
        const whole = [
          { id: 'a', table: timesAll(first, 3) },
          { id: 'b', table: second },
        ];
        const split = [
          { id: 'a1', table: first },
          { id: 'a2', table: timesAll(first, 2) },
          { id: 'b', table: second },
        ];
        const { value: before } = valueOf(pooledOddsRatio(whole, 0.95));
        expectNear(valueOf(pooledOddsRatio(split, 0.95)).value, before);
      }),
      SEEDED,
    );
  });
});

function strataOf(
  strata: StratifiedTable,
  change: (table: FourfoldTable) => FourfoldTable,
): StratifiedTable {
  return strata.map(({ id, table }) => ({ id, table: change(table) }));
}

function rowsOf({ index, reference }: FourfoldTable): readonly (readonly number[])[] {
  return [index, reference].map(({ events, total }) => [events, total - events]);
}

/** Exposure and outcome exchanged: for tables whose events and others both exist. */
function transposed({ index, reference }: FourfoldTable): FourfoldTable {
  return {
    index: { events: index.events, total: index.events + reference.events },
    reference: {
      events: index.total - index.events,
      total: index.total + reference.total - index.events - reference.events,
    },
  };
}

function timesAll({ index, reference }: FourfoldTable, times: number): FourfoldTable {
  const group = ({ events, total }: FourfoldTable['index']): FourfoldTable['index'] => ({
    events: events * times,
    total: total * times,
  });
  return { index: group(index), reference: group(reference) };
}

/** Fisher's two-sided p from whole numbers only: sums of products of binomial coefficients. */
function enumerated({ index, reference }: FourfoldTable): number {
  const drawn = index.events + reference.events;
  const weight = (count: number): bigint =>
    choose(index.total, count) * choose(reference.total, drawn - count);
  const observed = weight(index.events);
  let tail = 0n;
  for (let count = 0; count <= index.total; count += 1) {
    const one = weight(count);
    tail += one <= observed ? one : 0n;
  }
  const scale = 10n ** 30n;
  return Number((tail * scale) / choose(index.total + reference.total, drawn)) / Number(scale);
}

function choose(from: number, taken: number): bigint {
  if (taken < 0 || taken > from) {
    return 0n;
  }
  let ways = 1n;
  for (let step = 1; step <= taken; step += 1) {
    ways = (ways * BigInt(from - taken + step)) / BigInt(step);
  }
  return ways;
}

function valueOf<Value>(result: Result<Value, unknown>): Value {
  if (!result.ok) {
    throw new Error(`No value: ${JSON.stringify(result.issue)}`);
  }
  return result.value;
}

function expectNear(value: number, expected: number): void {
  const slack = 1e-8 * Math.abs(expected) + 1e-11;
  expect(Math.abs(value - expected)).toBeLessThanOrEqual(slack);
}
