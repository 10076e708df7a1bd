import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ADJUSTMENTS, FOURFOLD_TESTS, TEST_METHODS } from '#shared/stats';
import type { FourfoldTable, FourfoldTest } from '#shared/stats';
import { SEEDED, fourfold, smallFourfold, swapGroups, swapOutcome } from './fourfold-arbitraries';

const EMPTY = { events: 0, total: 0 };
const SOME = { events: 3, total: 10 };

describe.each(Object.values(FOURFOLD_TESTS) as readonly FourfoldTest[])('$label', (member) => {
  const heavy = member.effort === 'heavy';
  const tables = heavy ? smallFourfold : fourfold;
  const budget = heavy ? { ...SEEDED, numRuns: 60 } : SEEDED;

  it('is named and sourced once', () => {
    expect(TEST_METHODS).toHaveProperty([member.id], member);
    expect(member.citation).toMatch(/\b(19|20)\d\d;/);
    expect(member.shortLabel.length).toBeLessThanOrEqual(member.label.length);
  });

  it('gives p from 0 to 1, the same when groups or outcomes change places', () => {
    fc.assert(
      fc.property(tables, (table) => {
        const p = pValue(member, table);
        if (p === null) {
          expect(member.test(table)).toMatchObject({ issue: { code: 'emptyMargin' } });
          return;
        }
        expect(p).toBeGreaterThanOrEqual(0);
        expect(p).toBeLessThanOrEqual(1);
        expectNear(pValue(member, swapGroups(table)), p);
        expectNear(pValue(member, swapOutcome(table)), p);
      }),
      budget,
    );
  });

  it('refuses an empty group, impossible counts, and groups beyond its cap', () => {
    const code = (index: FourfoldTable['index']): unknown => {
      const outcome = member.test({ index, reference: SOME });
      return outcome.ok ? null : outcome.issue;
    };
    expect(code(EMPTY)).toMatchObject({ code: 'emptyGroup' });
    expect(code({ events: 11, total: 10 })).toMatchObject({ code: 'invalidCounts' });
    expect(member.groupCap === null).toBe(!heavy);
    const beyond = code({ events: 9, total: (member.groupCap ?? 1_000_000) + 1 });
    if (member.groupCap === null) {
      expect(beyond).toBeNull();
    } else {
      const facts = { cap: member.groupCap, instead: 'fisherMidP' };
      expect(beyond).toEqual({ code: 'tooLarge', facts });
    }
  });
});

describe('tests of fourfold tables beside each other', () => {
  it('mid-p and Boschloo are below Fisher, Yates above Pearson', () => {
    fc.assert(
      fc.property(smallFourfold, (table) => {
        const p = Object.fromEntries(
          Object.values(FOURFOLD_TESTS).map((member) => [member.id, pValue(member, table) ?? 1]),
        );
        const slack = 1e-9;
        expect(p.fisherMidP).toBeLessThanOrEqual((p.fisherExact ?? 1) + slack);
        expect(p.boschloo).toBeLessThanOrEqual((p.fisherExact ?? 1) + slack);
        expect(p.yates).toBeGreaterThanOrEqual((p.pearsonChiSquare ?? 0) - slack);
      }),
      { ...SEEDED, numRuns: 100 },
    );
  });

  it('the likelihood ratio goes to the squared score where the groups are nearly alike', () => {
    const table = {
      index: { events: 2_500_000, total: 5_000_000 },
      reference: { events: 2_500_010, total: 5_000_000 },
    };
    const [g, pearson] = [FOURFOLD_TESTS.likelihoodRatio, FOURFOLD_TESTS.pearsonChiSquare].map(
      (member) => {
        const outcome = member.test(table);
        return outcome.ok ? Number(outcome.value.statistic) : NaN;
      },
    );
    expect(g! / pearson!).toBeCloseTo(1, 9);
  });
});

describe('adjustments of p-values', () => {
  const family = fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { maxLength: 20 });

  it.each(Object.values(ADJUSTMENTS))('$label: in order, never below the p-value', (member) => {
    fc.assert(
      fc.property(family, (pValues) => {
        const adjusted = member.adjust(pValues);
        expect(adjusted).toHaveLength(pValues.length);
        adjusted.forEach((value, place) => {
          expect(value).toBeGreaterThanOrEqual(pValues[place]!);
          expect(value).toBeLessThanOrEqual(1);
          adjusted.forEach((other, otherPlace) => {
            if (pValues[place]! < pValues[otherPlace]!) {
              expect(value).toBeLessThanOrEqual(other);
            }
          });
        });
        expect(member.adjust([...pValues].reverse())).toEqual([...adjusted].reverse());
      }),
      SEEDED,
    );
  });

  it('stand in their order: Bonferroni, Holm, Hochberg, Benjamini–Hochberg', () => {
    fc.assert(
      fc.property(family, (pValues) => {
        const { bonferroni, holm, hochberg, benjaminiHochberg } = ADJUSTMENTS;
        const inOrder = [bonferroni, holm, hochberg, benjaminiHochberg].map((member) =>
          member.adjust(pValues),
        );
        pValues.forEach((_, place) => {
          const values = inOrder.map((adjusted) => adjusted[place]!);
          values.slice(1).forEach((value, at) => {
            expect(value).toBeLessThanOrEqual(values[at]! + 1e-15);
          });
        });
      }),
      SEEDED,
    );
  });

  it('leaves a single p-value as it is, and takes no other number', () => {
    for (const { adjust } of Object.values(ADJUSTMENTS)) {
      expect(adjust([0.03])).toEqual([0.03]);
      expect(adjust([])).toEqual([]);
      expect(() => adjust([0.2, 1.1])).toThrow('1.1');
    }
  });
});

function pValue(member: FourfoldTest, table: FourfoldTable): number | null {
  const outcome = member.test(table);
  return outcome.ok ? outcome.value.pValue : null;
}

function expectNear(value: number | null, expected: number): void {
  const slack = 1e-8 * Math.abs(expected) + 1e-11;
  expect(Math.abs((value ?? NaN) - expected)).toBeLessThanOrEqual(slack);
}
