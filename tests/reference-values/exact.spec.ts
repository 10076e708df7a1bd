import { describe, expect, it } from 'vitest';
import {
  FOURFOLD_TESTS,
  ODDS_RATIO_INTERVALS,
  RISK_DIFFERENCE_INTERVALS,
  RISK_RATIO_INTERVALS,
  adjustPValues,
  allEventsLowerLimit,
  zeroEventsUpperLimit,
} from '#shared/stats';
import type { AdjustmentId, FourfoldTable, FourfoldTestId, Interval } from '#shared/stats';
import type { Result } from '#shared/core';
import reference from './exact.json';
import { valueOf } from './quantities';

type Numbers = readonly (number | null)[];

interface ExactCase {
  readonly kind: string;
  readonly index?: readonly number[];
  readonly reference?: readonly number[];
  readonly level?: number;
}

/** Both sides are roots of the same sums, found to the last bits; the sums lose a few. */
const ROOTS = 1e-10;
/** R's plain sum of the likelihood ratio cancels near independence in large tables. */
const CANCELLING = 1e-7;
/** Maxima over a grid, refined on both sides. */
const MAXIMA = 1e-9;
/** Where extreme tables change, a limit jumps; both sides take ties within 1e-9 of the score. */
const JUMPS = 2e-8;

const cases = reference.cases as readonly ExactCase[];
const ofKind = (kind: string): readonly ExactCase[] => cases.filter((one) => one.kind === kind);

describe('conditional odds ratios and light tests against R', () => {
  interface Conditional {
    readonly estimate: number | null;
    readonly exact: Numbers;
    readonly midP: Numbers;
    readonly yates: readonly number[];
    readonly likelihoodRatio: readonly number[];
    readonly fisherMidP: number;
  }

  it.each(ofKind('conditional') as readonly (Conditional & ExactCase)[])('$index against $reference at $level', (one) => {
    const table = tableOf(one);
    const { conditionalExact, conditionalMidP } = ODDS_RATIO_INTERVALS;
    const estimate = conditionalExact.pointOf!(table);
    expectNear(estimate, one.estimate ?? Infinity, ROOTS);
    expect(conditionalMidP.pointOf!(table)).toBe(estimate);
    expectLimits(conditionalExact.interval(table, one.level!), one.exact, ROOTS);
    expectLimits(conditionalMidP.interval(table, one.level!), one.midP, ROOTS);
    expectTest('yates', table, one.yates, ROOTS);
    expectTest('likelihoodRatio', table, one.likelihoodRatio, CANCELLING);
    expectNear(pValue('fisherMidP', table), one.fisherMidP, 1e-8);
  });

  it('holds zero cells, and a limit beyond the reach of looser routines', () => {
    const conditional = ofKind('conditional') as readonly (Conditional & ExactCase)[];
    expect(conditional.filter(({ estimate }) => estimate === null).length).toBeGreaterThan(3);
    expect(conditional.some(({ exact }) => (exact[1] ?? 0) > 50_000)).toBe(true);
  });
});

describe('exact unconditional tests against brute force in R', () => {
  interface Unconditional {
    readonly barnard: number;
    readonly boschloo: number;
  }

  it.each(ofKind('unconditionalTest') as readonly (Unconditional & ExactCase)[])('$index against $reference', (one) => {
    expectNear(pValue('barnard', tableOf(one)), one.barnard, MAXIMA);
    expectNear(pValue('boschloo', tableOf(one)), one.boschloo, MAXIMA);
  });
});

describe('exact unconditional intervals against brute force in R', () => {
  interface Unconditional {
    readonly chanZhang: Numbers;
    readonly agrestiMin: Numbers;
    readonly ratio?: Numbers;
  }

  it.each(ofKind('unconditionalInterval') as readonly (Unconditional & ExactCase)[])(
    '$index against $reference at $level',
    (one) => {
      const table = tableOf(one);
      const { chanZhang, agrestiMin } = RISK_DIFFERENCE_INTERVALS;
      expectLimits(chanZhang.interval(table, one.level!), one.chanZhang, JUMPS);
      expectLimits(agrestiMin.interval(table, one.level!), one.agrestiMin, JUMPS);
      if (one.ratio) {
        expectLimits(RISK_RATIO_INTERVALS.chanZhang.interval(table, one.level!), one.ratio, JUMPS);
      }
    },
  );
});

describe('one group of nobody or everybody with the event, and adjusted p-values', () => {
  interface Zero {
    readonly total: number;
    readonly upper: number;
  }

  it.each(ofKind('zeroEvents') as readonly (Zero & ExactCase)[])('0 of $total at $level', ({ total, upper, level }) => {
    expectNear(valueOf(zeroEventsUpperLimit(total, level!)), upper, 1e-12);
    expectNear(valueOf(allEventsLowerLimit(total, level!)), 1 - upper, 1e-12);
  });

  type Adjusted = Readonly<Record<AdjustmentId, readonly number[]>> & {
    readonly pValues: readonly number[];
  };

  it.each(ofKind('adjusted') as readonly (Adjusted & ExactCase)[])('adjusts $pValues', (one) => {
    for (const id of ['holm', 'hochberg', 'benjaminiHochberg', 'bonferroni'] as const) {
      const adjusted = adjustPValues(id, one.pValues);
      expect(adjusted).toHaveLength(one.pValues.length);
      adjusted.forEach((value, place) => {
        expectNear(value, one[id][place]!, 1e-14);
      });
    }
  });
});

function tableOf({ index = [], reference: other = [] }: ExactCase): FourfoldTable {
  const [events = NaN, total = NaN] = index;
  const [otherEvents = NaN, otherTotal = NaN] = other;
  return {
    index: { events, total },
    reference: { events: otherEvents, total: otherTotal },
  };
}

function pValue(id: FourfoldTestId, table: FourfoldTable): number {
  return valueOf(FOURFOLD_TESTS[id].test(table)).pValue;
}

function expectTest(
  id: FourfoldTestId,
  table: FourfoldTable,
  [statistic = NaN, p = NaN]: readonly number[],
  relative: number,
): void {
  const outcome = valueOf(FOURFOLD_TESTS[id].test(table));
  expectNear(Number(outcome.statistic), statistic, relative);
  expectNear(outcome.pValue, p, relative);
}

/** An infinite upper limit is no interval here: the lower one is in the issue. */
function expectLimits(
  result: Result<Interval, { readonly code: string; readonly facts?: object }>,
  [lower, upper]: Numbers,
  relative: number,
): void {
  if (upper === null) {
    const facts = result.ok ? {} : (result.issue.facts ?? {});
    expectNear('atLeast' in facts ? Number(facts.atLeast) : NaN, lower ?? NaN, relative);
    return;
  }
  const interval = valueOf(result);
  expectNear(interval.lower, lower ?? NaN, relative);
  expectNear(interval.upper, upper ?? NaN, relative);
}

function expectNear(value: number, expected: number, relative: number): void {
  const floor = relative === JUMPS ? JUMPS : 1e-15;
  const near = Math.abs(value - expected) <= relative * Math.abs(expected) + floor;
  expect(near || value === expected, `${String(value)}, not ${String(expected)}`).toBe(true);
}
