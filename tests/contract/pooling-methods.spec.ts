import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { EFFECT_MEASURES, hasHomogeneity, hasPooling } from '#shared/effects';
import {
  DIFFERENCES_OF_DIFFERENCES,
  ODDS_RATIO_HOMOGENEITIES,
  ODDS_RATIO_INTERVALS,
  POOLED_ODDS_RATIOS,
  RISK_DIFFERENCE_HOMOGENEITIES,
  RISK_RATIO_HOMOGENEITIES,
  conditionalOddsRatioOf,
  ratioOfRatios,
} from '#shared/stats';
import type { FourfoldTable, PoolingMethod, StratifiedTable, TestOutcome } from '#shared/stats';
import { valueOf } from '../reference-values/value-of';
import {
  SEEDED,
  filledFourfold,
  filledStrata,
  fourfold,
  level,
  swapGroups,
  swapOutcome,
} from './fourfold-arbitraries';

const MEASURES = Object.values(EFFECT_MEASURES);
const MEMBERS = MEASURES.flatMap((measure) =>
  Object.values(measure.poolings).map((pooling) => ({
    name: `${measure.label}: ${pooling.label}`,
    measure,
    pooling,
    isConditional: pooling.id.startsWith('exact'),
  })),
);
const FEWER = { ...SEEDED, numRuns: 60 };

describe.each(MEASURES)('$label over strata', (measure) => {
  it('pools and tests by its defaults unless another way is named', () => {
    expect(hasPooling(measure.id, measure.defaultPoolingId)).toBe(true);
    expect(hasPooling(measure.id, 'toString')).toBe(false);
    expect(hasHomogeneity(measure.id, measure.defaultHomogeneityId)).toBe(true);
    expect(hasHomogeneity(measure.id, 'toString')).toBe(false);
    const [strata] = fc.sample(filledStrata, { seed: SEEDED.seed, numRuns: 1 });
    for (const [id, pooling] of Object.entries(measure.poolings)) {
      expect(measure.pooled(strata!, 0.9, id)).toEqual(pooling.pooled(strata!, 0.9));
    }
    for (const [id, method] of Object.entries(measure.homogeneities)) {
      expect(measure.homogeneity(strata!, id)).toEqual(method.test(strata!));
    }
    const named = measure.pooled(strata!, 0.9, measure.defaultPoolingId);
    expect(measure.pooled(strata!, 0.9)).toEqual(named);
    expect(() => measure.pooled(strata!, 0.9, 'guess')).toThrow('guess');
    expect(() => measure.homogeneity(strata!, 'guess')).toThrow('guess');
  });
});

/** Ways that become each other when the groups change places. */
const OPPOSITES: Readonly<Record<string, string>> = {
  standardisedToIndex: 'standardisedToReference',
  standardisedToReference: 'standardisedToIndex',
};

/** Every stratum with the same share in a chosen standard population. */
function weighed(strata: StratifiedTable): StratifiedTable {
  return strata.map((stratum) => ({ ...stratum, share: 1 }));
}

describe.each(MEMBERS)('$name', ({ measure, pooling, isConditional }) => {
  const pooled: PoolingMethod['pooled'] = (strata, at) => pooling.pooled(weighed(strata), at);
  const opposite: PoolingMethod['pooled'] = (strata, at) =>
    (measure.poolings[OPPOSITES[pooling.id] ?? ''] ?? pooling).pooled(weighed(strata), at);
  const mirror = (limit: number): number => (measure.scale === 'ratio' ? 1 / limit : 0 - limit);

  it('is named and sourced under its own id', () => {
    expect(measure.poolings[pooling.id]).toBe(pooling);
    expect(pooling.label.length).toBeGreaterThan(pooling.shortLabel.length - 1);
    expect(pooling.citation).toMatch(/\b(19|20)\d\d[;:.]/);
  });

  it('holds its estimate, widens with the level and mirrors when the groups change places', () => {
    fc.assert(
      fc.property(filledStrata, level, (strata, chosen) => {
        const { value, interval } = valueOf(pooled(strata, chosen));
        expect(interval).toMatchObject({ level: chosen, method: pooling.id });
        expect(interval.lower).toBeLessThanOrEqual(value);
        expect(interval.upper).toBeGreaterThanOrEqual(value);
        const wide = valueOf(pooled(strata, 1 - (1 - chosen) / 2)).interval;
        expect(wide.lower).toBeLessThanOrEqual(interval.lower);
        expect(wide.upper).toBeGreaterThanOrEqual(interval.upper);
        const turned = valueOf(opposite(changed(strata, swapGroups), chosen));
        expectNear(mirror(turned.value), value);
        expectNear(mirror(turned.interval.lower), interval.upper);
        expectNear(mirror(turned.interval.upper), interval.lower);
      }),
      FEWER,
    );
  });

  it('gives copies of one stratum the value of one, with narrower limits', () => {
    fc.assert(
      fc.property(filledFourfold, fc.integer({ min: 2, max: 6 }), (table, copies) => {
        const strata = Array.from({ length: copies }, (_, at) => ({ id: `${at}`, table }));
        const one = valueOf(pooled(strata.slice(0, 1), 0.95));
        const all = valueOf(pooled(strata, 0.95));
        expectNear(all.value, one.value);
        expect(all.interval.lower).toBeGreaterThan(one.interval.lower);
        expect(all.interval.upper).toBeLessThan(one.interval.upper);
      }),
      FEWER,
    );
  });

  it('gives one stratum the unpooled value', () => {
    fc.assert(
      fc.property(filledFourfold, (table) => {
        const { value } = valueOf(pooled([{ id: 'one', table }], 0.95));
        const { value: crude } = valueOf(measure.estimate(table, measure.defaultIntervalId, 0.95));
        expectNear(value, isConditional ? conditionalOddsRatioOf(table) : crude);
      }),
      FEWER,
    );
  });

  it('passes over strata that tell nothing, names them, and refuses when there is no other', () => {
    fc.assert(
      fc.property(filledStrata, fourfold, (strata, table) => {
        const issue = pooling.issueOfStratum(table);
        const odd = { id: 'odd', table };
        const leftOut = measure.uninformative([...strata, odd], pooling.id);
        expect(leftOut).toEqual(issue ? [{ stratumId: 'odd', issue }] : []);
        if (issue) {
          const padded = pooled([...strata, odd], 0.95);
          expect(padded).toEqual(pooled(strata, 0.95));
          expect(pooled([odd], 0.95)).toMatchObject({
            issue: { code: 'noInformativeStratum' },
          });
        }
      }),
      FEWER,
    );
  });

  it('refuses impossible levels and counts', () => {
    const [strata] = fc.sample(filledStrata, { seed: SEEDED.seed, numRuns: 1 });
    expect(pooled(strata!, 95)).toMatchObject({ issue: { code: 'invalidLevel' } });
    const wrong = { index: { events: 3, total: 2 }, reference: { events: 1, total: 2 } };
    const spoilt = [...strata!, { id: 'wrong', table: wrong }];
    expect(pooled(spoilt, 0.95)).toMatchObject({ issue: { code: 'invalidCounts' } });
  });
});

describe('exact common odds ratio', () => {
  const { exactConditional, exactMidP } = POOLED_ODDS_RATIOS;
  const oneStratum = [
    [exactConditional, ODDS_RATIO_INTERVALS.conditionalExact],
    [exactMidP, ODDS_RATIO_INTERVALS.conditionalMidP],
  ] as const;

  it.each(oneStratum)('of one stratum is the conditional odds ratio of the table', (all, one) => {
    fc.assert(
      fc.property(fourfold, level, (table, chosen) => {
        const pooled = all.pooled([{ id: 'one', table }], chosen);
        const direct = one.interval(table, chosen);
        if (pooled.ok && direct.ok) {
          expectNear(pooled.value.interval.lower, direct.value.lower);
          expectNear(pooled.value.interval.upper, direct.value.upper);
        } else {
          const code = pooled.ok ? 'none' : pooled.issue.code;
          expect(['noInformativeStratum', 'zeroCell', 'tooLarge']).toContain(code);
        }
      }),
      FEWER,
    );
  });

  it('lies within exact limits when they are mid-p', () => {
    fc.assert(
      fc.property(filledStrata, (strata) => {
        const wide = valueOf(exactConditional.pooled(strata, 0.95)).interval;
        const narrow = valueOf(exactMidP.pooled(strata, 0.95)).interval;
        expect(narrow.lower).toBeGreaterThan(wide.lower);
        expect(narrow.upper).toBeLessThan(wide.upper);
      }),
      FEWER,
    );
  });

  it('is 0 from 0 where no fewer events were possible, and refuses infinity', () => {
    const table = { index: { events: 0, total: 9 }, reference: { events: 4, total: 9 } };
    const none = valueOf(exactConditional.pooled([{ id: 'one', table }], 0.95));
    expect(none.value).toBe(0);
    expect(none.interval.lower).toBe(0);
    expect(none.interval.upper).toBeGreaterThan(0);
    const turned = exactConditional.pooled([{ id: 'one', table: swapGroups(table) }], 0.95);
    expect(turned).toMatchObject({ issue: { code: 'zeroCell' } });
  });

  it('says its cap and what to use beyond it', () => {
    const half = { events: 6000, total: 12_000 };
    const strata = ['a', 'b'].map((id) => ({ id, table: { index: half, reference: half } }));
    expect(exactConditional.pooled(strata.slice(0, 1), 0.95).ok).toBe(true);
    expect(exactConditional.pooled(strata, 0.95)).toEqual({
      ok: false,
      issue: { code: 'tooLarge', facts: { cap: 20_000, instead: 'robinsBreslowGreenland' } },
    });
  });
});

describe('homogeneity', () => {
  it('of two strata is the test of their interaction', () => {
    fc.assert(
      fc.property(filledFourfold, filledFourfold, (first, second) => {
        const strata = [
          { id: 'a', table: first },
          { id: 'b', table: second },
        ];
        const pairs = [
          [ODDS_RATIO_HOMOGENEITIES.woolf, ratioOfRatios(first, second, 'oddsRatio', 0.95)],
          [
            RISK_RATIO_HOMOGENEITIES.inverseVariance,
            ratioOfRatios(first, second, 'riskRatio', 0.95),
          ],
          [
            RISK_DIFFERENCE_HOMOGENEITIES.inverseVariance,
            DIFFERENCES_OF_DIFFERENCES.waldContrast.contrast(first, second, 0.95),
          ],
        ] as const;
        for (const [method, interaction] of pairs) {
          const test: TestOutcome = valueOf(method.test(strata).outcome);
          expectNear(Number(test.statistic), Number(valueOf(interaction).test.statistic));
        }
      }),
      SEEDED,
    );
  });

  it.each(Object.values(ODDS_RATIO_HOMOGENEITIES))(
    '$label does not change when groups or outcomes change places',
    (method) => {
      fc.assert(
        fc.property(filledStrata, (strata) => {
          const statisticOf = (tables: StratifiedTable): number =>
            Number(valueOf(method.test(tables).outcome).statistic);
          const statistic = statisticOf(strata);
          expectNear(statisticOf(changed(strata, swapGroups)), statistic);
          expectNear(statisticOf(changed(strata, swapOutcome)), statistic);
        }),
        FEWER,
      );
    },
  );

  it('Woolf adds nothing to a zero cell: the stratum is left out and named', () => {
    const filled = { index: { events: 3, total: 9 }, reference: { events: 4, total: 9 } };
    const zero = { index: { events: 0, total: 9 }, reference: { events: 4, total: 9 } };
    const strata = [filled, zero, swapGroups(filled)].map((table, at) => ({ id: `${at}`, table }));
    const { outcome, leftOut } = ODDS_RATIO_HOMOGENEITIES.woolf.test(strata);
    expect(valueOf(outcome).degreesOfFreedom).toBe(1);
    expect(leftOut).toEqual([{ stratumId: '1', issue: { code: 'zeroCell' } }]);
    const few = ODDS_RATIO_HOMOGENEITIES.woolf.test(strata.slice(0, 2));
    expect(few.outcome).toMatchObject({ issue: { code: 'fewerThanTwoStrata' } });
  });
});

function changed(
  strata: StratifiedTable,
  change: (table: FourfoldTable) => FourfoldTable,
): StratifiedTable {
  return strata.map(({ id, table }) => ({ id, table: change(table) }));
}

function expectNear(value: number, expected: number): void {
  const slack = 1e-8 * Math.abs(expected) + 1e-11;
  expect(Math.abs(value - expected), `${value} for ${expected}`).toBeLessThanOrEqual(slack);
}
