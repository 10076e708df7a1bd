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
import type {
  EstimationIssue,
  FourfoldTable,
  GroupCount,
  Interval,
  IntervalMethod,
} from '#shared/stats';
import type { Result } from '#shared/core';
import {
  SEEDED,
  complement,
  fourfold,
  group,
  level,
  smallFourfold,
  swapGroups,
  swapOutcome,
} from './fourfold-arbitraries';

interface Estimand<Counts> {
  readonly name: string;
  readonly methods: Readonly<Record<string, IntervalMethod<Counts>>>;
  readonly counts: fc.Arbitrary<Counts>;
  /** Counts for methods that take milliseconds. */
  readonly smallCounts: fc.Arbitrary<Counts>;
  readonly emptyCounts: readonly Counts[];
  readonly invalidCounts: Counts;
  beyond(large: GroupCount): Counts;
  readonly least: number;
  readonly most: number;
  value(counts: Counts): number;
  mirrored(counts: Counts): Counts;
  /** A limit of the mirrored counts, seen from the counts themselves. */
  mirror(limit: number): number;
  /** The counts with events and others exchanged, where that mirrors the estimand too. */
  readonly complemented?: (counts: Counts) => Counts;
}

const EMPTY: GroupCount = { events: 0, total: 0 };
const SOME: GroupCount = { events: 3, total: 10 };
const INVALID: GroupCount = { events: 11, total: 10 };

const FOURFOLD = {
  counts: fourfold,
  smallCounts: smallFourfold,
  emptyCounts: [
    { index: EMPTY, reference: SOME },
    { index: SOME, reference: EMPTY },
  ],
  invalidCounts: { index: INVALID, reference: SOME },
  beyond: (large: GroupCount) => ({ index: large, reference: SOME }),
  mirrored: swapGroups,
};

const risk: Estimand<GroupCount> = {
  name: 'risk',
  methods: RISK_INTERVALS,
  counts: group,
  smallCounts: group,
  emptyCounts: [EMPTY],
  invalidCounts: INVALID,
  beyond: (large) => large,
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
  complemented: swapOutcome,
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
  complemented: swapOutcome,
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
        const value = (method.pointOf ?? estimand.value)(counts);
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
      forAll(estimand, method, (counts, interval) => {
        const mirrored = method.interval(estimand.mirrored(counts), interval.level);
        expectMirrored(estimand, mirrored, interval);
      });
    });

    const { complemented } = estimand;
    if (complemented) {
      it('mirrors when the outcomes change places', () => {
        forAll(estimand, method, (counts, interval) => {
          const mirrored = method.interval(complemented(counts), interval.level);
          expectMirrored(estimand, mirrored, interval);
        });
      });
    }

    it('says what it costs, and keeps to its cap', () => {
      expect(['light', 'heavy']).toContain(method.effort);
      expect(method.groupCap === null).toBe(method.effort === 'light');
      const issue = issueBeyond(estimand, method);
      expect(issue?.code).toBe(method.groupCap === null ? undefined : 'tooLarge');
      if (issue) {
        expect(issue.facts).toMatchObject({ cap: method.groupCap });
        expect(estimand.methods[String(issue.facts?.instead)]?.groupCap).toBeNull();
      }
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

/**
 * Limits of the mirrored counts, against those of the counts. A lower limit of 0 stands across from
 * an infinite upper one, in place of which the issue has the other limit.
 */
function expectMirrored<Counts>(
  estimand: Estimand<Counts>,
  mirrored: Result<Interval, EstimationIssue>,
  { lower, upper }: Interval,
): void {
  if (mirrored.ok) {
    expectNear(estimand.mirror(mirrored.value.lower), upper);
    expectNear(estimand.mirror(mirrored.value.upper), lower);
  } else if (mirrored.issue.facts?.atLeast !== undefined) {
    expect(lower).toBe(0);
    expectNear(estimand.mirror(Number(mirrored.issue.facts.atLeast)), upper);
  }
}

/** The issue of a table one larger than the cap; of a large table where there is none. */
function issueBeyond<Counts>(
  estimand: Estimand<Counts>,
  method: IntervalMethod<Counts>,
): EstimationIssue | null {
  const total = (method.groupCap ?? 1_000_000) + 1;
  const large = { events: 9, total };
  const counts = estimand.beyond(large);
  const result = method.interval(counts, 0.95);
  return result.ok ? null : result.issue;
}

/** How finely the heavy methods search their limits. */
const SEARCHED = 1e-9;

/** Runs a law over counts for which the method is defined; most counts must be. */
function forAll<Counts>(
  estimand: Estimand<Counts>,
  method: IntervalMethod<Counts>,
  law: (counts: Counts, interval: Interval) => void,
): void {
  let defined = 0;
  const heavy = method.effort === 'heavy';
  const runs = heavy ? { ...SEEDED, numRuns: 30 } : SEEDED;
  const counted = heavy ? estimand.smallCounts : estimand.counts;
  fc.assert(
    fc.property(counted, level, (counts, chosen) => {
      const result = method.interval(counts, chosen);
      if (result.ok) {
        defined += 1;
        expect(result.value).toMatchObject({ level: chosen, method: method.id });
        law(counts, result.value);
      } else {
        expect(result.issue.code).toBe('zeroCell');
      }
    }),
    runs,
  );
  expect(defined).toBeGreaterThan(runs.numRuns / 2);
}

function issueCode(
  result: { readonly ok: true } | { readonly ok: false; readonly issue: { readonly code: string } },
): string | null {
  return result.ok ? null : result.issue.code;
}

function expectNear(value: number, expected: number): void {
  const slack = 1e-8 * Math.max(1e-3, Math.abs(expected)) + SEARCHED;
  expect(Math.abs(value - expected)).toBeLessThanOrEqual(slack);
}
