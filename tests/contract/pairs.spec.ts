import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  MATCHED_ODDS_RATIO_INTERVALS,
  PAIRED_DIFFERENCE_INTERVALS,
  PAIRED_TESTS,
  POOLED_ODDS_RATIOS,
  cochranMantelHaenszel,
  matchedOddsRatioOf,
  pairedDifferenceOf,
} from '#shared/stats';
import type { IntervalMethod, PairedTable, StratifiedTable } from '#shared/stats';
import { valueOf } from '../reference-values/value-of';
import { SEEDED, level } from './fourfold-arbitraries';

const count = fc.oneof(fc.integer({ min: 0, max: 4 }), fc.integer({ min: 0, max: 90 }));
const pairs: fc.Arbitrary<PairedTable> = fc
  .record({ both: count, onlyFirst: count, onlySecond: count, neither: count })
  .filter(
    ({ both, onlyFirst, onlySecond, neither }) => both + onlyFirst + onlySecond + neither > 0,
  );

const NO_PAIRS: PairedTable = { both: 0, onlyFirst: 0, onlySecond: 0, neither: 0 };
const AGREE: PairedTable = { both: 5, onlyFirst: 0, onlySecond: 0, neither: 3 };
const BROKEN: PairedTable = { both: 5, onlyFirst: 1.5, onlySecond: 0, neither: 3 };

describe.each(Object.values(PAIRED_TESTS))('$label', (test) => {
  it('is named and sourced under its own id', () => {
    expect(PAIRED_TESTS[test.id]).toBe(test);
    expect(test.citation).toMatch(/\b(19|20)\d\d[;:.]/);
  });

  it('gives a p from 0 to 1 that does not change when the members change places', () => {
    fc.assert(
      fc.property(pairs, (table) => {
        const found = test.test(table);
        expect(found.ok).toBe(table.onlyFirst + table.onlySecond > 0);
        if (found.ok) {
          expect(found.value.pValue).toBeGreaterThan(0);
          expect(found.value.pValue).toBeLessThanOrEqual(1);
          expect(valueOf(test.test(swapMembers(table))).pValue).toBeCloseTo(found.value.pValue, 12);
        }
      }),
      SEEDED,
    );
  });

  it('refuses pairs that all agree, no pairs, and counts that are not whole', () => {
    expect(test.test(AGREE)).toMatchObject({ issue: { code: 'noDiscordantPairs' } });
    expect(test.test(NO_PAIRS)).toMatchObject({ issue: { code: 'emptyGroup' } });
    expect(test.test(BROKEN)).toMatchObject({ issue: { code: 'invalidCounts' } });
  });
});

describe('McNemar', () => {
  it('mid-p lies below the exact p', () => {
    fc.assert(
      fc.property(pairs, (table) => {
        const exact = PAIRED_TESTS.mcnemarExact.test(table);
        const midP = PAIRED_TESTS.mcnemarMidP.test(table);
        if (exact.ok && midP.ok) {
          expect(midP.value.pValue).toBeLessThan(exact.value.pValue);
        }
      }),
      SEEDED,
    );
  });
});

interface Estimand {
  readonly name: string;
  readonly methods: Readonly<Record<string, IntervalMethod<PairedTable>>>;
  readonly least: number;
  readonly most: number;
  readonly issues: readonly string[];
  value(table: PairedTable): number;
  mirror(limit: number): number;
}

const ESTIMANDS: readonly Estimand[] = [
  {
    name: 'difference of paired proportions',
    methods: PAIRED_DIFFERENCE_INTERVALS,
    least: -1,
    most: 1,
    issues: [],
    value: pairedDifferenceOf,
    mirror: (limit) => 0 - limit,
  },
  {
    name: 'matched odds ratio',
    methods: MATCHED_ODDS_RATIO_INTERVALS,
    least: 0,
    most: Infinity,
    issues: ['zeroCell', 'noDiscordantPairs'],
    value: matchedOddsRatioOf,
    mirror: (limit) => 1 / limit,
  },
];

describe.each(
  ESTIMANDS.flatMap((estimand) =>
    Object.values(estimand.methods).map((method) => ({
      label: `${method.label} for a ${estimand.name}`,
      estimand,
      method,
    })),
  ),
)('$label', ({ estimand, method }) => {
  it('gives limits in range that hold the value, widen with the level, mirror with the members', () => {
    fc.assert(
      fc.property(pairs, level, (table, chosen) => {
        const found = method.interval(table, chosen);
        if (!found.ok) {
          expect(estimand.issues).toContain(found.issue.code);
          return;
        }
        const { lower, upper } = found.value;
        const value = estimand.value(table);
        expect(found.value).toMatchObject({ level: chosen, method: method.id });
        expect(lower).toBeGreaterThanOrEqual(estimand.least);
        expect(upper).toBeLessThanOrEqual(estimand.most);
        expect(lower).toBeLessThanOrEqual(value + 1e-12);
        expect(upper).toBeGreaterThanOrEqual(value - 1e-12);
        const wide = valueOf(method.interval(table, 1 - (1 - chosen) / 3));
        expect(wide.lower).toBeLessThanOrEqual(lower + 1e-12);
        expect(wide.upper).toBeGreaterThanOrEqual(upper * (1 - 1e-12) - 1e-12);
        const turned = method.interval(swapMembers(table), chosen);
        if (turned.ok && lower > estimand.least) {
          expectNear(estimand.mirror(turned.value.lower), upper);
          expectNear(estimand.mirror(turned.value.upper), lower);
        }
      }),
      SEEDED,
    );
  });

  it('is named and sourced, and refuses no pairs, broken counts and impossible levels', () => {
    expect(estimand.methods[method.id]).toBe(method);
    expect(method.citation).toMatch(/\b(19|20)\d\d[;:.]/);
    const codeOf = (table: PairedTable, chosen = 0.95): string | null => {
      const found = method.interval(table, chosen);
      return found.ok ? null : found.issue.code;
    };
    expect(codeOf(NO_PAIRS)).toBe('emptyGroup');
    expect(codeOf(BROKEN)).toBe('invalidCounts');
    expect(codeOf(AGREE, 1)).toBe('invalidLevel');
  });
});

describe('pairs as strata of two', () => {
  it('give McNemar, the matched odds ratio and its exact limits', () => {
    fc.assert(
      fc.property(pairs, (table) => {
        const strata = strataOf(table);
        const mcnemar = PAIRED_TESTS.mcnemar.test(table);
        const pooled = cochranMantelHaenszel(strata);
        expect(pooled.ok).toBe(mcnemar.ok);
        if (mcnemar.ok && pooled.ok) {
          expectNear(Number(pooled.value.statistic), Number(mcnemar.value.statistic));
        }
        const exact = POOLED_ODDS_RATIOS.exactConditional.pooled(strata, 0.95);
        const matched = MATCHED_ODDS_RATIO_INTERVALS.matchedExact.interval(table, 0.95);
        expect(exact.ok).toBe(matched.ok);
        if (exact.ok && matched.ok) {
          expectNear(exact.value.value, matchedOddsRatioOf(table));
          expectNear(exact.value.interval.lower, matched.value.lower);
          expectNear(exact.value.interval.upper, matched.value.upper);
        }
      }),
      { ...SEEDED, numRuns: 60 },
    );
  });
});

function swapMembers({ both, onlyFirst, onlySecond, neither }: PairedTable): PairedTable {
  return { both, onlyFirst: onlySecond, onlySecond: onlyFirst, neither };
}

/** Each pair is a stratum; its first member is the index group. */
function strataOf({ both, onlyFirst, onlySecond, neither }: PairedTable): StratifiedTable {
  const kinds = [
    [both, 1, 1],
    [onlyFirst, 1, 0],
    [onlySecond, 0, 1],
    [neither, 0, 0],
  ] as const;
  return kinds.flatMap(([pairsOfKind, first, second], kind) =>
    Array.from({ length: pairsOfKind }, (_, at) => ({
      id: `${kind}-${at}`,
      table: { index: { events: first, total: 1 }, reference: { events: second, total: 1 } },
    })),
  );
}

function expectNear(value: number, expected: number): void {
  const slack = 1e-8 * Math.abs(expected) + 1e-11;
  expect(Math.abs(value - expected), `${value} for ${expected}`).toBeLessThanOrEqual(slack);
}
