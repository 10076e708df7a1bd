import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  ODDS_RATIO_INTERVALS,
  RISK_DIFFERENCE_INTERVALS,
  RISK_INTERVALS,
  RISK_RATIO_INTERVALS,
  hypergeometricProbability,
} from '#shared/stats';
import type { FourfoldTable, GroupCount, Interval, IntervalMethod } from '#shared/stats';
import { criticalValue } from '../../shared/stats/distributions';
import { oddsRatioScore } from '../../shared/stats/intervals/score/odds-ratio-score';
import { riskDifferenceScore } from '../../shared/stats/intervals/score/risk-difference-score';
import { riskRatioScore } from '../../shared/stats/intervals/score/risk-ratio-score';
import { inflation } from '../../shared/stats/intervals/score/standardised';
import { differences, logRatios, unconditionalPValue } from '../../shared/stats/unconditional';
import type { UnconditionalTest } from '../../shared/stats/unconditional';
import {
  SEEDED,
  filledFourfold,
  groups,
  level,
  smallFourfold,
  swapGroups,
} from './fourfold-arbitraries';

const smallGroup = groups(40);

/** Each limit is the value at which the method's own test is just on the edge. */
describe('score limits are where the score is the critical value', () => {
  interface Scored {
    readonly name: string;
    readonly method: IntervalMethod<FourfoldTable>;
    readonly score: (table: FourfoldTable, limit: number) => number;
  }

  const scored: readonly Scored[] = [
    {
      name: 'Miettinen–Nurminen difference',
      method: RISK_DIFFERENCE_INTERVALS.miettinenNurminen,
      score: (table, limit) => riskDifferenceScore(table)(limit),
    },
    {
      name: 'Koopman ratio',
      method: RISK_RATIO_INTERVALS.koopman,
      score: (table, limit) => riskRatioScore(table, 1)(Math.log(limit)),
    },
    {
      name: 'Miettinen–Nurminen ratio',
      method: RISK_RATIO_INTERVALS.miettinenNurminen,
      score: (table, limit) => riskRatioScore(table, inflation(table))(Math.log(limit)),
    },
    {
      name: 'Cornfield odds ratio',
      method: ODDS_RATIO_INTERVALS.cornfield,
      score: (table, limit) => oddsRatioScore(table, 1)(Math.log(limit)),
    },
    {
      name: 'Miettinen–Nurminen odds ratio',
      method: ODDS_RATIO_INTERVALS.miettinenNurminen,
      score: (table, limit) => oddsRatioScore(table, inflation(table))(Math.log(limit)),
    },
  ];

  it.each(scored)('$name', ({ method, score }) => {
    fc.assert(
      fc.property(filledFourfold, level, (table, chosen) => {
        const { lower, upper } = intervalOf(method, table, chosen);
        const z = criticalValue(chosen);
        expect(score(table, lower) / z).toBeCloseTo(1, 6);
        expect(score(table, upper) / -z).toBeCloseTo(1, 6);
      }),
      SEEDED,
    );
  });

  it('Wilson', () => {
    fc.assert(
      fc.property(smallGroup, level, (count, chosen) => {
        const { lower, upper } = intervalOf(RISK_INTERVALS.wilson, count, chosen);
        const share = count.events / count.total;
        for (const limit of [lower, upper].filter((one) => one > 0 && one < 1)) {
          const error = Math.sqrt((limit * (1 - limit)) / count.total);
          expect(Math.abs(share - limit) / error / criticalValue(chosen)).toBeCloseTo(1, 8);
        }
      }),
      SEEDED,
    );
  });
});

describe('exact limits are where a tail is half of what the level leaves', () => {
  it('Clopper–Pearson', () => {
    fc.assert(
      fc.property(smallGroup, level, (count, chosen) => {
        const { lower, upper } = intervalOf(RISK_INTERVALS.clopperPearson, count, chosen);
        const tail = (1 - chosen) / 2;
        if (count.events > 0) {
          expect(atLeastEvents(count, lower) / tail).toBeCloseTo(1, 7);
        }
        if (count.events < count.total) {
          const complement = { events: count.total - count.events, total: count.total };
          expect(atLeastEvents(complement, 1 - upper) / tail).toBeCloseTo(1, 7);
        }
      }),
      SEEDED,
    );
  });

  it.each([
    ['exact', ODDS_RATIO_INTERVALS.conditionalExact, 1],
    ['mid-p', ODDS_RATIO_INTERVALS.conditionalMidP, 0.5],
  ] as const)('conditional odds ratio, %s', (_name, method, share) => {
    fc.assert(
      fc.property(smallFourfold, level, (table, chosen) => {
        const result = method.interval(table, chosen);
        const tail = (1 - chosen) / 2;
        if (result.ok && result.value.lower > 0) {
          expect(conditionalTail(table, result.value.lower, share) / tail).toBeCloseTo(1, 8);
        }
        if (result.ok) {
          const turned = conditionalTail(swapGroups(table), 1 / result.value.upper, share);
          expect(turned / tail).toBeCloseTo(1, 8);
        }
      }),
      SEEDED,
    );
  });

  interface Unconditional {
    readonly name: string;
    readonly method: IntervalMethod<FourfoldTable>;
    readonly sides: UnconditionalTest['sides'];
    readonly familyOf: typeof differences;
    readonly tested: (limit: number) => number;
  }

  const { chanZhang, agrestiMin } = RISK_DIFFERENCE_INTERVALS;
  const same = (limit: number): number => limit;
  const unconditional: readonly Unconditional[] = [
    { name: 'one-sided', method: chanZhang, sides: 'upper', familyOf: differences, tested: same },
    { name: 'two-sided', method: agrestiMin, sides: 'both', familyOf: differences, tested: same },
    {
      name: 'ratio',
      method: RISK_RATIO_INTERVALS.chanZhang,
      sides: 'upper',
      familyOf: logRatios,
      tested: Math.log,
    },
  ];

  it.each(unconditional)('unconditional, $name', ({ method, sides, familyOf, tested }) => {
    fc.assert(
      fc.property(smallFourfold, level, (table, chosen) => {
        const result = method.interval(table, chosen);
        if (!result.ok || result.value.lower <= (sides === 'upper' ? 0 : -1)) {
          return;
        }
        const family = familyOf(table.index.total, table.reference.total);
        const pValue = (value: number): number =>
          unconditionalPValue(table, { family, sides }, value);
        const tail = sides === 'both' ? 1 - chosen : (1 - chosen) / 2;
        const limit = tested(result.value.lower);
        expect(pValue(limit - 1e-7)).toBeLessThanOrEqual(tail * (1 + 1e-6));
        expect(pValue(limit + 1e-9)).toBeGreaterThanOrEqual(tail * (1 - 1e-6));
        for (const farther of [0.01, 0.1, 0.4]) {
          const outside = Math.max(limit - farther, familyOf === differences ? -1 : -9);
          expect(pValue(outside)).toBeLessThanOrEqual(tail * (1 + 1e-6));
        }
      }),
      { ...SEEDED, numRuns: 40 },
    );
  });
});

describe('limits rise with the events of the index group', () => {
  const { newcombe, miettinenNurminen } = RISK_DIFFERENCE_INTERVALS;
  const { cornfield, conditionalExact, conditionalMidP } = ODDS_RATIO_INTERVALS;
  const monotone = [newcombe, miettinenNurminen, cornfield, conditionalExact, conditionalMidP];

  it.each(monotone)('$label', (method) => {
    fc.assert(
      fc.property(filledFourfold, level, (table, chosen) => {
        const { events, total } = table.index;
        const more = { ...table, index: { events: Math.min(events + 1, total - 1), total } };
        expectRising(intervalOf(method, table, chosen), intervalOf(method, more, chosen));
      }),
      SEEDED,
    );
  });

  it.each(Object.values(RISK_INTERVALS))('$label', (method) => {
    fc.assert(
      fc.property(smallGroup, level, ({ events, total }, chosen) => {
        const more = { events: Math.min(events + 1, total), total };
        expectRising(
          intervalOf(method, { events, total }, chosen),
          intervalOf(method, more, chosen),
        );
      }),
      SEEDED,
    );
  });
});

function expectRising(fewer: Interval, more: Interval): void {
  const slack = 1e-10 * Math.max(1, fewer.upper);
  expect(more.lower).toBeGreaterThanOrEqual(fewer.lower - slack);
  expect(more.upper).toBeGreaterThanOrEqual(fewer.upper - slack);
}

function intervalOf<Counts>(
  method: IntervalMethod<Counts>,
  counts: Counts,
  chosen: number,
): Interval {
  const result = method.interval(counts, chosen);
  if (!result.ok) {
    throw new Error(`${method.id}: ${result.issue.code}`);
  }
  return result.value;
}

/** Probability of at least so many events, summed from scratch. */
function atLeastEvents({ events, total }: GroupCount, risk: number): number {
  let term = (1 - risk) ** total;
  let below = 0;
  for (let count = 0; count < events; count += 1) {
    below += term;
    term *= ((total - count) / (count + 1)) * (risk / (1 - risk));
  }
  let tail = 0;
  for (let count = events; count <= total; count += 1) {
    tail += term;
    term *= ((total - count) / (count + 1)) * (risk / (1 - risk));
  }
  return tail / (below + tail);
}

/** Probability of more index events than observed, and a share of that of as many. */
function conditionalTail({ index, reference }: FourfoldTable, ratio: number, own: number): number {
  const drawn = index.events + reference.events;
  const urn = { marked: index.total, unmarked: reference.total, drawn };
  let [tail, whole] = [0, 0];
  for (let count = 0; count <= index.total; count += 1) {
    const weight = hypergeometricProbability(count, urn) * ratio ** (count - index.events);
    whole += weight;
    tail += count > index.events ? weight : count === index.events ? own * weight : 0;
  }
  return tail / whole;
}
