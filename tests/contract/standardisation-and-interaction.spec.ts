import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  DIFFERENCES_OF_DIFFERENCES,
  RISK_DIFFERENCE_INTERVALS,
  RISK_RATIO_INTERVALS,
  excessRisk,
  ratioOfRatios,
  standardisedRisks,
} from '#shared/stats';
import type {
  GroupCount,
  StandardPopulation,
  StratifiedTable,
  TwoFactorCounts,
} from '#shared/stats';
import { valueOf } from '../reference-values/value-of';
import { SEEDED, filledFourfold, filledStrata, level, swapGroups } from './fourfold-arbitraries';

const POPULATIONS: readonly StandardPopulation[] = [
  { kind: 'total' },
  { kind: 'index' },
  { kind: 'reference' },
];

describe('standardised risks', () => {
  it('over one stratum are the crude ones, with Wald and Katz limits', () => {
    fc.assert(
      fc.property(filledFourfold, level, (table, chosen) => {
        const strata = [{ id: 'one', table }];
        const shares = { one: 7 };
        for (const population of [...POPULATIONS, { kind: 'chosen', shares } as const]) {
          const found = valueOf(standardisedRisks(strata, population, chosen));
          expectNear(valueOf(found.index).value, shareOf(table.index));
          const wald = valueOf(RISK_DIFFERENCE_INTERVALS.wald.interval(table, chosen));
          const difference = valueOf(found.difference).interval;
          expectNear(difference.lower, wald.lower);
          expectNear(difference.upper, wald.upper);
          const katz = valueOf(RISK_RATIO_INTERVALS.katz.interval(table, chosen));
          expectNear(valueOf(found.ratio).interval.lower, katz.lower);
          expectNear(valueOf(found.ratio).interval.upper, katz.upper);
        }
      }),
      SEEDED,
    );
  });

  it('to a group itself are its crude risk; to the total, those by its members as shares', () => {
    fc.assert(
      fc.property(filledStrata, (strata) => {
        for (const kind of ['index', 'reference'] as const) {
          const found = valueOf(standardisedRisks(strata, { kind }, 0.95));
          const events = strata.reduce((sum, { table }) => sum + table[kind].events, 0);
          const total = strata.reduce((sum, { table }) => sum + table[kind].total, 0);
          expectNear(valueOf(found[kind]).value, events / total);
        }
        const total = valueOf(standardisedRisks(strata, { kind: 'total' }, 0.95));
        const chosen = valueOf(standardisedRisks(strata, membersOf(strata, 1), 0.95));
        const scaled = valueOf(standardisedRisks(strata, membersOf(strata, 0.125), 0.95));
        expect(chosen).toEqual(total);
        expect(scaled).toEqual(total);
        expectNear(
          Object.values(total.shares).reduce((sum, share) => sum + share, 0),
          1,
        );
      }),
      SEEDED,
    );
  });

  it('turn with the groups, and collapse when the strata are copies', () => {
    fc.assert(
      fc.property(filledStrata, fc.integer({ min: 2, max: 5 }), (strata, copies) => {
        const there = valueOf(standardisedRisks(strata, { kind: 'index' }, 0.95));
        const turned = strata.map(({ id, table }) => ({ id, table: swapGroups(table) }));
        const back = valueOf(standardisedRisks(turned, { kind: 'reference' }, 0.95));
        expect(back.index).toEqual(there.reference);
        expectNear(valueOf(back.difference).value, -valueOf(there.difference).value);
        expectNear(valueOf(back.ratio).interval.lower, 1 / valueOf(there.ratio).interval.upper);
        const [{ table }] = strata as [StratifiedTable[number]];
        const same = Array.from({ length: copies }, (_, at) => ({ id: `${at}`, table }));
        const all = valueOf(standardisedRisks(same, { kind: 'total' }, 0.95));
        expectNear(valueOf(all.index).value, shareOf(table.index));
      }),
      SEEDED,
    );
  });

  it('demand members of both groups in every stratum with a share, and name the stratum', () => {
    const filled = { index: { events: 3, total: 9 }, reference: { events: 4, total: 9 } };
    const empty = { index: { events: 3, total: 9 }, reference: { events: 0, total: 0 } };
    const strata = [
      { id: 'young', table: filled },
      { id: 'old', table: empty },
    ];
    const issueOf = (population: StandardPopulation): unknown => {
      const found = standardisedRisks(strata, population, 0.95);
      return found.ok ? null : found.issue;
    };
    const facts = { stratum: 'old', group: 'reference' };
    expect(issueOf({ kind: 'total' })).toEqual({ code: 'emptyGroupInStratum', facts });
    expect(issueOf({ kind: 'reference' })).toBeNull();
    expect(issueOf({ kind: 'chosen', shares: { young: 2, old: 0 } })).toBeNull();
    const wrong = { code: 'invalidWeights', facts: { stratum: 'old' } };
    expect(issueOf({ kind: 'chosen', shares: { young: 2 } })).toEqual(wrong);
    expect(issueOf({ kind: 'chosen', shares: { young: 2, old: -1 } })).toEqual(wrong);
    expect(issueOf({ kind: 'chosen', shares: { young: 0, old: 0 } })).toEqual({
      code: 'invalidWeights',
    });
    const strange = { code: 'invalidWeights', facts: { stratum: 'elderly' } };
    expect(issueOf({ kind: 'chosen', shares: { young: 2, old: 0, elderly: 1 } })).toEqual(strange);
  });

  it('are not estimable without variance, nor a ratio with 0', () => {
    const table = { index: { events: 0, total: 9 }, reference: { events: 4, total: 9 } };
    const found = valueOf(standardisedRisks([{ id: 'one', table }], { kind: 'total' }, 0.95));
    expect(found.index).toMatchObject({ issue: { code: 'zeroCell' } });
    expect(found.ratio).toMatchObject({ issue: { code: 'zeroCell' } });
    expect(found.difference.ok).toBe(true);
  });
});

describe('interaction', () => {
  it('turns with the strata, and is none between equal ones', () => {
    fc.assert(
      fc.property(filledFourfold, filledFourfold, level, (first, second, chosen) => {
        for (const ratio of ['riskRatio', 'oddsRatio'] as const) {
          const there = valueOf(ratioOfRatios(first, second, ratio, chosen));
          const back = valueOf(ratioOfRatios(second, first, ratio, chosen));
          expectNear(back.estimate.value, 1 / there.estimate.value);
          expectNear(back.estimate.interval.lower, 1 / there.estimate.interval.upper);
          expectNear(back.test.pValue, there.test.pValue);
          const same = valueOf(ratioOfRatios(first, first, ratio, chosen));
          expect(same.estimate.value).toBe(1);
          expect(same.test.pValue).toBe(1);
        }
        for (const method of Object.values(DIFFERENCES_OF_DIFFERENCES)) {
          const there = valueOf(method.contrast(first, second, chosen)).estimate;
          const back = valueOf(method.contrast(second, first, chosen)).estimate;
          expect(there.interval.method).toBe(method.id);
          expectNear(back.value, -there.value);
          expectNear(back.interval.lower, -there.interval.upper);
          expect(there.interval.lower).toBeLessThanOrEqual(there.value);
          expect(valueOf(method.contrast(first, first, chosen)).estimate.value).toBe(0);
        }
      }),
      SEEDED,
    );
  });

  it('refuses zero cells and empty groups as its ratios do', () => {
    const filled = { index: { events: 3, total: 9 }, reference: { events: 4, total: 9 } };
    const zero = { index: { events: 0, total: 9 }, reference: { events: 4, total: 9 } };
    const sure = { index: { events: 9, total: 9 }, reference: { events: 0, total: 9 } };
    const contrast = DIFFERENCES_OF_DIFFERENCES.squareAndAddContrast;
    expect(ratioOfRatios(filled, zero, 'oddsRatio', 0.95)).toMatchObject({
      issue: { code: 'zeroCell' },
    });
    expect(contrast.contrast(filled, zero, 0.95).ok).toBe(true);
    expect(contrast.contrast(sure, sure, 0.95)).toMatchObject({ issue: { code: 'zeroCell' } });
  });
});

describe('relative excess risk', () => {
  const group = (events: number, total: number): GroupCount => ({ events, total });
  const counts: TwoFactorCounts = {
    both: group(60, 200),
    firstOnly: group(30, 200),
    secondOnly: group(40, 200),
    neither: group(10, 200),
  };

  it('is the ratios less those of the parts, plus 1, and none where risks add up', () => {
    const found = valueOf(excessRisk(counts, 'riskRatios', 0.95));
    expectNear(found.estimate.value, 6 - 3 - 4 + 1);
    expect(found.test.pValue).toBeCloseTo(1, 9);
    const exchanged = { ...counts, firstOnly: counts.secondOnly, secondOnly: counts.firstOnly };
    expect(valueOf(excessRisk(exchanged, 'riskRatios', 0.95)).estimate.value).toBe(
      found.estimate.value,
    );
  });

  it('is refused for a factor that lowers the risk, with the group to refer to instead', () => {
    const lowered = { ...counts, firstOnly: group(4, 200) };
    expect(excessRisk(lowered, 'oddsRatios', 0.95)).toEqual({
      ok: false,
      issue: { code: 'protectiveFactor', facts: { reference: 'firstOnly' } },
    });
    const recoded: TwoFactorCounts = {
      neither: lowered.firstOnly,
      firstOnly: lowered.neither,
      secondOnly: lowered.both,
      both: lowered.secondOnly,
    };
    expect(excessRisk(recoded, 'oddsRatios', 0.95).ok).toBe(true);
  });

  it('refuses groups without events, for odds also without others, and empty ones', () => {
    const codeOf = (changed: Partial<TwoFactorCounts>, from: 'riskRatios' | 'oddsRatios') => {
      const found = excessRisk({ ...counts, ...changed }, from, 0.95);
      return found.ok ? null : found.issue.code;
    };
    expect(codeOf({ both: group(0, 200) }, 'riskRatios')).toBe('zeroCell');
    expect(codeOf({ both: group(200, 200) }, 'riskRatios')).toBeNull();
    expect(codeOf({ both: group(200, 200) }, 'oddsRatios')).toBe('zeroCell');
    expect(codeOf({ both: group(0, 0) }, 'riskRatios')).toBe('emptyGroup');
    expect(codeOf({ both: group(3, 2) }, 'riskRatios')).toBe('invalidCounts');
  });
});

function shareOf({ events, total }: GroupCount): number {
  return events / total;
}

/** The members of both groups of each stratum, times a number, as shares. */
function membersOf(strata: StratifiedTable, times: number): StandardPopulation {
  const shares = strata.map(({ id, table }) => [
    id,
    times * (table.index.total + table.reference.total),
  ]);
  return { kind: 'chosen', shares: Object.fromEntries(shares) as Record<string, number> };
}

function expectNear(value: number, expected: number): void {
  const slack = 1e-8 * Math.abs(expected) + 1e-11;
  expect(Math.abs(value - expected), `${value} for ${expected}`).toBeLessThanOrEqual(slack);
}
