import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  adjustedResiduals,
  cramersV,
  fisherOfFourfold,
  fisherOfTable,
  likelihoodRatioOfTable,
  pearsonOfTable,
} from '#shared/stats';
import type { ContingencyTable } from '#shared/stats';
import type { Result } from '#shared/core';
import { valueOf } from '../reference-values/value-of';
import { enumeratedTables, turned } from './enumeration';
import type { Rows } from './enumeration';
import { SEEDED, groups } from './fourfold-arbitraries';
import { tables } from './table-arbitraries';

const FEWER = { ...SEEDED, numRuns: 100 };

describe('exact test of tables of any size', () => {
  it('agrees with listing every table by whole numbers', () => {
    fc.assert(
      fc.property(tables(3, 3), (rows) => {
        const found = fisherOfTable({ counts: rows });
        if (found.ok) {
          expectNear(found.value.pValue, enumeratedTables(rows));
        }
      }),
      SEEDED,
    );
  });

  it('is Fisher of a fourfold table', () => {
    fc.assert(
      fc.property(groups(120), groups(120), (index, reference) => {
        const direct = fisherOfFourfold({ index, reference });
        const counts = [index, reference].map(({ events, total }) => [events, total - events]);
        const found = fisherOfTable({ counts });
        expect(found.ok).toBe(direct.ok);
        if (found.ok && direct.ok) {
          expectNear(found.value.pValue, direct.value.pValue);
        }
      }),
      SEEDED,
    );
  });

  it('says what it is too large in, and what to use instead', () => {
    const factsOf = (counts: Rows): unknown => {
      const found = fisherOfTable({ counts });
      return found.ok ? null : found.issue;
    };
    const instead = 'pearsonChiSquare';
    const issueOf = (cap: number, of: string): unknown => ({
      code: 'tooLarge',
      facts: { cap, of, instead },
    });
    expect(
      factsOf([
        [1, 700],
        [2, 700],
        [3, 700],
      ]),
    ).toEqual(issueOf(1500, 'records'));
    const many = Array.from({ length: 20 }, (_, at) => [20 + at, 30 - at]);
    expect(factsOf(many)).toEqual(issueOf(1e15, 'tables'));
    const partial = Array.from({ length: 6 }, (_, at) => [50 + 10 * at, 100 - 7 * at]);
    expect(factsOf(partial)).toEqual(issueOf(2_000_000, 'partialTables'));
    expect(factsOf(partial.slice(0, 3))).toBeNull();
  });
});

const TABLE_TESTS = {
  'exact test': fisherOfTable,
  'likelihood-ratio test': likelihoodRatioOfTable,
} as const satisfies Readonly<
  Record<string, (table: ContingencyTable) => Result<unknown, unknown>>
>;

describe.each(Object.entries(TABLE_TESTS))('%s of tables of any size', (_name, test) => {
  it('does not see the order of lines, which way they run, nor empty ones', () => {
    fc.assert(
      fc.property(tables(6), (rows) => {
        const found = test({ counts: rows });
        if (!found.ok) {
          expect(['fewerThanTwoLevels', 'emptyMargin']).toContain(found.issue.code);
          return;
        }
        const { pValue } = found.value;
        expect(pValue).toBeGreaterThan(0);
        expect(pValue).toBeLessThanOrEqual(1);
        const reversed = [...rows].reverse().map((row) => [...row].reverse());
        const padded = [...rows.map((row) => [...row, 0]), rows[0]!.map(() => 0).concat(0)];
        for (const counts of [reversed, turned(rows), padded]) {
          expectNear(valueOf(test({ counts })).pValue, pValue);
        }
      }),
      FEWER,
    );
  });

  it('refuses counts that are not whole and tables of uneven rows', () => {
    for (const counts of [
      [
        [1, 2],
        [3.5, 1],
      ],
      [
        [1, 2],
        [-1, 1],
      ],
      [[1, 2], [3]],
    ]) {
      expect(test({ counts })).toMatchObject({ issue: { code: 'invalidCounts' } });
    }
    expect(test({ counts: [] })).toMatchObject({ issue: { code: 'fewerThanTwoLevels' } });
  });
});

describe('residuals and association', () => {
  it('squared residuals of a fourfold table are Pearson; each line of residuals has both signs', () => {
    fc.assert(
      fc.property(groups(5000), groups(5000), (index, reference) => {
        const table = {
          counts: [index, reference].map(({ events, total }) => [events, total - events]),
        };
        const pearson = pearsonOfTable(table);
        const residuals = adjustedResiduals(table);
        expect(residuals.ok).toBe(pearson.ok);
        if (pearson.ok && residuals.ok) {
          for (const residual of residuals.value.flat()) {
            expectNear(Number(residual) ** 2, Number(pearson.value.statistic));
          }
        }
      }),
      SEEDED,
    );
  });

  it('V runs from 0 for equal rows to 1 where the row tells the column', () => {
    fc.assert(
      fc.property(tables(40), (rows) => {
        const v = cramersV({ counts: rows });
        if (v.ok) {
          expect(v.value).toBeGreaterThanOrEqual(0);
          expect(v.value).toBeLessThanOrEqual(1 + 1e-12);
        }
      }),
      SEEDED,
    );
    expect(
      valueOf(
        cramersV({
          counts: [
            [3, 6],
            [5, 10],
          ],
        }),
      ),
    ).toBeCloseTo(0, 12);
    expect(
      valueOf(
        cramersV({
          counts: [
            [3, 0, 0],
            [0, 8, 0],
            [0, 0, 2],
          ],
        }),
      ),
    ).toBeCloseTo(1, 12);
  });

  it('residuals of empty lines are null, in their places', () => {
    const found = valueOf(
      adjustedResiduals({
        counts: [
          [1, 0, 2],
          [0, 0, 0],
          [3, 0, 1],
        ],
      }),
    );
    expect(found[1]).toEqual([null, null, null]);
    expect(found.map((row) => row[1])).toEqual([null, null, null]);
    expect(Number(found[0]?.[0])).toBeLessThan(0);
  });
});

function expectNear(value: number, expected: number): void {
  const slack = 1e-8 * Math.abs(expected) + 1e-11;
  expect(Math.abs(value - expected), `${value} for ${expected}`).toBeLessThanOrEqual(slack);
}
