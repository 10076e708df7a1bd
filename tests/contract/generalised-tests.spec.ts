import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  cochranMantelHaenszel,
  generalAssociation,
  linearByLinear,
  pearsonOfTable,
  rowMeanScores,
  scoreCorrelation,
} from '#shared/stats';
import type { StratifiedContingency } from '#shared/stats';
import { valueOf } from '../reference-values/value-of';
import type { Rows } from './enumeration';
import { SEEDED, filledStrata } from './fourfold-arbitraries';
import { tables } from './table-arbitraries';

const FEWER = { ...SEEDED, numRuns: 100 };

describe('generalised tests over strata', () => {
  it('are the Cochran–Mantel–Haenszel test for fourfold tables', () => {
    fc.assert(
      fc.property(filledStrata, (strata) => {
        const plain = Number(valueOf(cochranMantelHaenszel(strata)).statistic);
        const wide: StratifiedContingency = strata.map(({ id, table }) => ({
          id,
          table: {
            counts: [table.index, table.reference].map(({ events, total }) => [
              events,
              total - events,
            ]),
          },
        }));
        const scores = { rowScores: [2, 5], columnScores: [1, 0] };
        const found = [
          generalAssociation(wide),
          rowMeanScores(wide, scores.columnScores),
          scoreCorrelation(wide, scores),
        ].map((test) => valueOf(test));
        for (const { statistic, degreesOfFreedom } of found) {
          expectNear(Number(statistic), plain);
          expect(degreesOfFreedom).toBe(1);
        }
      }),
      FEWER,
    );
  });

  it('of one table are Pearson times (N - 1) / N, and linear-by-linear', () => {
    fc.assert(
      fc.property(tables(30), (rows) => {
        const strata = [{ id: 'one', table: { counts: rows } }];
        const pearson = pearsonOfTable({ counts: rows });
        const general = generalAssociation(strata);
        expect(general.ok).toBe(pearson.ok);
        if (pearson.ok && general.ok) {
          const total = rows.flat().reduce((sum, count) => sum + count, 0);
          expect(general.value.degreesOfFreedom).toBe(pearson.value.degreesOfFreedom);
          const expected = (Number(pearson.value.statistic) * (total - 1)) / total;
          expectNear(Number(general.value.statistic), expected);
        }
        const scores = {
          rowScores: rows.map((_, at) => at),
          columnScores: rows[0]!.map((_, at) => at * at),
        };
        const linear = linearByLinear({ counts: rows, ...scores });
        if (linear.ok) {
          const correlation = valueOf(scoreCorrelation(strata, scores));
          expectNear(Number(correlation.statistic), Number(linear.value.statistic));
        }
      }),
      SEEDED,
    );
  });

  it('keep their statistics when lines change places and scores are moved', () => {
    const pairs = fc.tuple(tables(20), tables(20));
    fc.assert(
      fc.property(pairs, ([one, other]) => {
        const rows = Math.min(one.length, other.length);
        const columns = Math.min(one[0]!.length, other[0]!.length);
        const cut = (table: Rows): Rows => table.slice(0, rows).map((row) => row.slice(0, columns));
        const back = (table: Rows): Rows =>
          [...cut(table)].reverse().map((row) => [...row].reverse());
        const strata = [cut(one), cut(other)].map(stratum);
        const reversed = [back(one), back(other)].map(stratum);
        const scores = Array.from({ length: columns }, (_, at) => at * at);
        const moved = [...scores].reverse().map((score) => 3 - 2 * score);
        const found = [generalAssociation(strata), rowMeanScores(strata, scores)];
        const again = [generalAssociation(reversed), rowMeanScores(reversed, moved)];
        found.forEach((test, at) => {
          const second = again[at]!;
          expect(second.ok).toBe(test.ok);
          if (test.ok && second.ok) {
            expect(second.value.degreesOfFreedom).toBe(test.value.degreesOfFreedom);
            expectNear(Number(second.value.statistic), Number(test.value.statistic));
          }
        });
      }),
      FEWER,
    );
  });

  it('refuse tables of different shapes, and strata that tell nothing', () => {
    const square = {
      id: 'a',
      table: {
        counts: [
          [1, 2],
          [3, 4],
        ],
      },
    };
    const wide = {
      id: 'b',
      table: {
        counts: [
          [1, 2, 3],
          [3, 4, 5],
        ],
      },
    };
    const fixed = {
      id: 'c',
      table: {
        counts: [
          [1, 2],
          [0, 0],
        ],
      },
    };
    expect(generalAssociation([square, wide])).toMatchObject({ issue: { code: 'invalidCounts' } });
    expect(generalAssociation([square, fixed])).toEqual(generalAssociation([square]));
    const none = { issue: { code: 'noInformativeStratum' } };
    expect(generalAssociation([fixed])).toMatchObject(none);
    expect(generalAssociation([])).toMatchObject({ ok: false });
    expect(rowMeanScores([square], [1, 1])).toMatchObject(none);
  });
});

function stratum(counts: Rows, at: number): StratifiedContingency[number] {
  return { id: `${at}`, table: { counts } };
}

function expectNear(value: number, expected: number): void {
  const slack = 1e-8 * Math.abs(expected) + 1e-11;
  expect(Math.abs(value - expected), `${value} for ${expected}`).toBeLessThanOrEqual(slack);
}
