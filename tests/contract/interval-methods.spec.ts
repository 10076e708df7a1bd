import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  ODDS_RATIO_INTERVALS,
  RISK_DIFFERENCE_INTERVALS,
  RISK_INTERVALS,
  RISK_RATIO_INTERVALS,
  oddsRatioOf,
  riskDifferenceOf,
  riskRatioOf,
} from '#shared/stats';
import type { FourfoldTable, GroupCount, Interval, IntervalMethod } from '#shared/stats';
import { SEEDED, complement, fourfold, group, level, swapGroups } from './fourfold-arbitraries';

interface Estimand<Counts> {
  readonly name: string;
  readonly methods: Readonly<Record<string, IntervalMethod<Counts>>>;
  readonly counts: fc.Arbitrary<Counts>;
  readonly emptyCounts: readonly Counts[];
  readonly invalidCounts: Counts;
  readonly least: number;
  readonly most: number;
  value(counts: Counts): number;
  mirrored(counts: Counts): Counts;
  /** A limit of the mirrored counts, seen from the counts themselves. */
  mirror(limit: number): number;
}

const EMPTY: GroupCount = { events: 0, total: 0 };
const SOME: GroupCount = { events: 3, total: 10 };
const INVALID: GroupCount = { events: 11, total: 10 };

const FOURFOLD = {
  counts: fourfold,
  emptyCounts: [
    { index: EMPTY, reference: SOME },
    { index: SOME, reference: EMPTY },
  ],
  invalidCounts: { index: INVALID, reference: SOME },
  mirrored: swapGroups,
};

const risk: Estimand<GroupCount> = {
  name: 'risk',
  methods: RISK_INTERVALS,
  counts: group,
  emptyCounts: [EMPTY],
  invalidCounts: INVALID,
  least: 0,
  most: 1,
  value: ({ events, total }) => events / total,
  mirrored: complement,
  mirror: (limit) => 1 - limit,
};

const riskDifference: Estimand<FourfoldTable> = {
  ...FOURFOLD,
  name: 'risk difference',
  methods: RISK_DIFFERENCE_INTERVALS,
  least: -1,
  most: 1,
  value: riskDifferenceOf,
  mirror: (limit) => -limit,
};

const riskRatio: Estimand<FourfoldTable> = {
  ...FOURFOLD,
  name: 'risk ratio',
  methods: RISK_RATIO_INTERVALS,
  least: 0,
  most: Infinity,
  value: riskRatioOf,
  mirror: (limit) => 1 / limit,
};

const oddsRatio: Estimand<FourfoldTable> = {
  ...FOURFOLD,
  name: 'odds ratio',
  methods: ODDS_RATIO_INTERVALS,
  least: 0,
  most: Infinity,
  value: oddsRatioOf,
  mirror: (limit) => 1 / limit,
};

lawsOf(risk);
lawsOf(riskDifference);
lawsOf(riskRatio);
lawsOf(oddsRatio);

function lawsOf<Counts>(estimand: Estimand<Counts>): void {
  describe.each(Object.values(estimand.methods))(`$label for a ${estimand.name}`, (method) => {
    it('is named and sourced under its own id', () => {
      expect(estimand.methods[method.id]).toBe(method);
      expect(method.label.length).toBeGreaterThan(3);
      expect(method.shortLabel.length).toBeLessThanOrEqual(method.label.length);
      expect(method.citation).toMatch(/\b(19|20)\d\d[;:.]/);
    });

    it('gives finite limits in range that hold the estimate, or an issue', () => {
      forAll(estimand, method, (counts, { lower, upper }) => {
        const value = estimand.value(counts);
        const slack = 1e-12 * Math.max(1, Math.abs(value));
        expect(Number.isFinite(lower) && Number.isFinite(upper)).toBe(true);
        expect(lower).toBeGreaterThanOrEqual(estimand.least);
        expect(upper).toBeLessThanOrEqual(estimand.most);
        expect(lower).toBeLessThanOrEqual(value + slack);
        expect(upper).toBeGreaterThanOrEqual(value - slack);
      });
    });

    it('widens with the level', () => {
      forAll(estimand, method, (counts, narrow) => {
        const wide = method.interval(counts, 1 - (1 - narrow.level) / 3);
        if (!wide.ok) {
          throw new Error(`Undefined at a higher level: ${wide.issue.code}`);
        }
        const slack = 1e-12 * Math.max(1, narrow.upper);
        expect(wide.value.lower).toBeLessThanOrEqual(narrow.lower + slack);
        expect(wide.value.upper).toBeGreaterThanOrEqual(narrow.upper - slack);
      });
    });

    it('mirrors when the groups (of a risk: the outcomes) change places', () => {
      forAll(estimand, method, (counts, { lower, upper, level: chosen }) => {
        const mirrored = method.interval(estimand.mirrored(counts), chosen);
        if (mirrored.ok && mirrored.value.lower > estimand.least) {
          expectNear(estimand.mirror(mirrored.value.lower), upper);
          expectNear(estimand.mirror(mirrored.value.upper), lower);
        }
      });
    });

    it('refuses an empty group, impossible counts and an impossible level', () => {
      for (const counts of estimand.emptyCounts) {
        expect(issueCode(method.interval(counts, 0.95))).toBe('emptyGroup');
      }
      expect(issueCode(method.interval(estimand.invalidCounts, 0.95))).toBe('invalidCounts');
      for (const impossible of [0, 1, -0.5, 95, NaN]) {
        const result = method.interval(fc.sample(estimand.counts, 1)[0]!, impossible);
        expect(issueCode(result)).toBe('invalidLevel');
      }
    });
  });
}

/** Runs a law over counts for which the method is defined; most counts must be. */
function forAll<Counts>(
  estimand: Estimand<Counts>,
  method: IntervalMethod<Counts>,
  law: (counts: Counts, interval: Interval) => void,
): void {
  let defined = 0;
  fc.assert(
    fc.property(estimand.counts, level, (counts, chosen) => {
      const result = method.interval(counts, chosen);
      if (result.ok) {
        defined += 1;
        expect(result.value).toMatchObject({ level: chosen, method: method.id });
        law(counts, result.value);
      } else {
        expect(result.issue.code).toBe('zeroCell');
      }
    }),
    SEEDED,
  );
  expect(defined).toBeGreaterThan(SEEDED.numRuns / 2);
}

function issueCode(
  result: { readonly ok: true } | { readonly ok: false; readonly issue: { readonly code: string } },
): string | null {
  return result.ok ? null : result.issue.code;
}

function expectNear(value: number, expected: number): void {
  expect(Math.abs(value - expected)).toBeLessThanOrEqual(1e-8 * Math.max(1e-3, Math.abs(expected)));
}
