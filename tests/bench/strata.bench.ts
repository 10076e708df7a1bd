import { expect, it } from 'vitest';
import { POOLED_ODDS_RATIOS, TREND_TESTS, fisherOfTable } from '#shared/stats';
import type { StratifiedTable } from '#shared/stats';
import { report, timed } from './measure';

it('finds exact limits of a common odds ratio over 50 strata', () => {
  tell('exact common odds ratio over 50 strata of 165 to 183', strata(15, 70));
});

it('finds exact limits of a common odds ratio over 50 strata at its cap', () => {
  tell('exact common odds ratio over 50 strata of 800, near its cap', strata(175, 210));
});

it('tests tables of any size exactly', () => {
  exact('exact test of a 4 × 4 table of 96', 500, SATISFACTION);
  exact('exact test of a 5 × 5 table of 40', 500, SPARSE);
  exact('exact test of a 4 × 4 table of 123, near its cap', 2000, NEAR_CAP);
});

it('gives up tables that are too large for an exact test', () => {
  const beyond = Array.from({ length: 6 }, (_, at) => [50 + 10 * at, 100 - 7 * at]);
  exact('exact test of a 6 × 2 table of 1000, given up', 2500, beyond, false);
  const panel = Array.from({ length: 20 }, (_, at) => [20 + at, 30 - at]);
  exact('exact test of a 20 × 2 table of 1000, not begun', 1, panel, false);
});

it('tests a trend exactly near its cap', () => {
  const groups = [1, 2, 3, 4, 5].map((score) => ({ events: 34 + 2 * score, total: 100, score }));
  const timing = timed(
    () => groups,
    (list) => TREND_TESTS.exactTrend.test(list),
  );
  expect(TREND_TESTS.exactTrend.test(groups).ok).toBe(true);
  report({
    what: 'exact trend over 5 groups of 100 with 200 events',
    budgetInMilliseconds: 200,
    timing,
    floor: null,
  });
});

function tell(what: string, tables: StratifiedTable): void {
  const pool = (input: StratifiedTable): unknown =>
    POOLED_ODDS_RATIOS.exactConditional.pooled(input, 0.95);
  expect(pool(tables)).toMatchObject({ ok: true });
  const timing = timed(() => tables, pool);
  report({ what, budgetInMilliseconds: 50, timing, floor: null });
}

function exact(
  what: string,
  budgetInMilliseconds: number,
  counts: readonly (readonly number[])[],
  fits = true,
): void {
  expect(fisherOfTable({ counts }).ok).toBe(fits);
  const timing = timed(
    () => ({ counts }),
    (table) => fisherOfTable(table),
    { runs: 5, warmUps: 1 },
  );
  report({ what, budgetInMilliseconds, timing, floor: null });
}

/** Invented strata with about so many events and others in each group. */
function strata(events: number, others: number): StratifiedTable {
  return Array.from({ length: 50 }, (_, at) => {
    const more = at % 10;
    return {
      id: String(at),
      table: {
        index: { events: events + 5 + more, total: events + others + more },
        reference: { events: events + more, total: events + others + more },
      },
    };
  });
}

const SATISFACTION = [
  [1, 3, 10, 6],
  [2, 3, 10, 7],
  [1, 6, 14, 12],
  [0, 1, 9, 11],
];
const SPARSE = [
  [2, 1, 0, 3, 1],
  [1, 4, 2, 0, 1],
  [0, 2, 3, 3, 2],
  [1, 1, 2, 2, 4],
  [3, 1, 1, 2, 1],
];
const NEAR_CAP = [
  [5, 8, 10, 6],
  [7, 3, 10, 7],
  [8, 6, 9, 12],
  [10, 11, 9, 2],
];
