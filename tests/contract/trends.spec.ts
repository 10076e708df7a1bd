import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { TREND_TESTS, linearByLinear } from '#shared/stats';
import type { ScoredGroup } from '#shared/stats';
import { valueOf } from '../reference-values/value-of';
import { enumeratedTrend } from './enumeration';
import { SEEDED, groups } from './fourfold-arbitraries';

const scored: fc.Arbitrary<readonly ScoredGroup[]> = fc
  .array(fc.record({ group: groups(9), score: fc.integer({ min: -4, max: 9 }) }), {
    minLength: 2,
    maxLength: 4,
  })
  .map((list) => list.map(({ group, score }) => ({ ...group, score })));

describe.each(Object.values(TREND_TESTS))('$label', (test) => {
  it('is named and sourced under its own id', () => {
    expect(TREND_TESTS[test.id]).toBe(test);
    expect(test.citation).toMatch(/\b(19|20)\d\d[;:.]/);
  });

  it('keeps its p when scores are moved and scaled, groups reordered, outcomes exchanged', () => {
    fc.assert(
      fc.property(scored, (list) => {
        const found = test.test(list);
        if (!found.ok) {
          expect(['fewerThanTwoLevels', 'emptyMargin']).toContain(found.issue.code);
          return;
        }
        expect(found.value.method).toBe(test.id);
        const { pValue } = found.value;
        const moved = list.map((group) => ({ ...group, score: 3.5 - 0.25 * group.score }));
        const others = list.map((group) => ({ ...group, events: group.total - group.events }));
        const padded = [...list, { events: 0, total: 0, score: 77 }];
        for (const changed of [moved, others, padded, [...list].reverse()]) {
          expectNear(valueOf(test.test(changed)).pValue, pValue);
        }
      }),
      SEEDED,
    );
  });
});

describe('exact trend', () => {
  it('agrees with listing every table by whole numbers', () => {
    fc.assert(
      fc.property(scored, (list) => {
        const found = TREND_TESTS.exactTrend.test(list);
        if (found.ok) {
          expectNear(found.value.pValue, enumeratedTrend(list));
        }
      }),
      SEEDED,
    );
  });

  it('says its cap, and takes no scores finer than a millionth', () => {
    const group = { events: 400, total: 1000 };
    const large = [1, 2, 3].map((score) => ({ ...group, score }));
    expect(TREND_TESTS.exactTrend.test(large)).toEqual({
      ok: false,
      issue: { code: 'tooLarge', facts: { cap: 40_000_000, instead: 'cochranArmitage' } },
    });
    const fine = [0, 1, Math.SQRT2].map((score) => ({ events: 1, total: 4, score }));
    expect(TREND_TESTS.exactTrend.test(fine)).toMatchObject({ issue: { code: 'invalidCounts' } });
  });
});

describe('linear-by-linear', () => {
  it('is Cochran–Armitage times (N - 1) / N for events and others', () => {
    fc.assert(
      fc.property(scored, (list) => {
        const armitage = TREND_TESTS.cochranArmitage.test(list);
        if (armitage.ok) {
          const total = list.reduce((sum, group) => sum + group.total, 0);
          const { statistic } = valueOf(TREND_TESTS.linearByLinear.test(list));
          expectNear(Number(statistic), (Number(armitage.value.statistic) * (total - 1)) / total);
        }
      }),
      SEEDED,
    );
  });

  it('refuses scores that do not fit the table', () => {
    const counts = [
      [1, 2],
      [3, 4],
    ];
    const codeOf = (rowScores: number[], columnScores: number[]): string | null => {
      const found = linearByLinear({ counts, rowScores, columnScores });
      return found.ok ? null : found.issue.code;
    };
    expect(codeOf([1, 2], [1, 2])).toBeNull();
    expect(codeOf([1, 2, 3], [1, 2])).toBe('invalidCounts');
    expect(codeOf([1, NaN], [1, 2])).toBe('invalidCounts');
    expect(codeOf([1, 1], [1, 2])).toBe('fewerThanTwoLevels');
    expect(codeOf([1, 2], [1, 1])).toBe('emptyMargin');
  });
});

function expectNear(value: number, expected: number): void {
  const slack = 1e-8 * Math.abs(expected) + 1e-11;
  expect(Math.abs(value - expected), `${value} for ${expected}`).toBeLessThanOrEqual(slack);
}
