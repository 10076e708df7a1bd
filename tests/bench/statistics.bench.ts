import { it } from 'vitest';
import {
  FOURFOLD_TESTS,
  ODDS_RATIO_INTERVALS,
  RISK_DIFFERENCE_INTERVALS,
  RISK_INTERVALS,
  RISK_RATIO_INTERVALS,
} from '#shared/stats';
import type { FourfoldTable, FourfoldTest, GroupCount, IntervalMethod } from '#shared/stats';
import { report, timed } from './measure';

const HUNDREDS = tables([
  [30, 100, 20, 100],
  [7, 100, 1, 100],
  [55, 100, 48, 100],
  [0, 100, 5, 100],
]);
const CAPPED = tables([
  [150, 500, 120, 500],
  [12, 500, 3, 500],
]);
const MILLIONS = tables([
  [1_250_000, 5_000_000, 1_251_000, 5_000_000],
  [2_500_000, 5_000_000, 2_499_000, 5_000_000],
  [40, 5_000_000, 90, 5_000_000],
]);

const UNCONDITIONAL = [
  ['Chan–Zhang difference', RISK_DIFFERENCE_INTERVALS.chanZhang],
  ['Agresti–Min difference', RISK_DIFFERENCE_INTERVALS.agrestiMin],
  ['exact unconditional ratio', RISK_RATIO_INTERVALS.chanZhang],
] as const;

it.each(UNCONDITIONAL)('%s of 100 and 100, of 500 and 500', (name, method) => {
  tell(`${name}, 100 + 100`, 50, HUNDREDS, (table) => method.interval(table, 0.95));
  tell(`${name}, 500 + 500`, 2000, CAPPED, (table) => method.interval(table, 0.95));
});

it.each([
  ["Barnard's test", FOURFOLD_TESTS.barnard],
  ["Boschloo's test", FOURFOLD_TESTS.boschloo],
])('%s of 100 and 100, of 500 and 500', (name, member) => {
  tell(`${name}, 100 + 100`, 50, HUNDREDS, member.test);
  tell(`${name}, 500 + 500`, 2000, CAPPED, member.test);
});

it('conditional methods of ten million people', () => {
  tell("Fisher's exact test, 10,000,000", 5, MILLIONS, FOURFOLD_TESTS.fisherExact.test);
  const { conditionalExact } = ODDS_RATIO_INTERVALS;
  tell('exact conditional odds ratio, 10,000,000', 5, MILLIONS, (table) => [
    conditionalExact.pointOf?.(table),
    conditionalExact.interval(table, 0.95),
  ]);
});

it('every light method over 20 levels in 10 strata', () => {
  const groups = panel();
  const timing = timed(() => groups, everyLightMethod);
  report({
    what: 'all light methods of two groups, 20 levels × 10 strata',
    budgetInMilliseconds: 20,
    timing,
    floor: null,
  });
});

/** Times the slowest of some tables. */
function tell(
  what: string,
  budgetInMilliseconds: number,
  of: readonly FourfoldTable[],
  work: (table: FourfoldTable) => unknown,
): void {
  const timings = of.map((table) => timed(() => table, work, { runs: 9, warmUps: 3 }));
  const [timing] = timings.toSorted((one, other) => other.median - one.median);
  if (timing) report({ what, budgetInMilliseconds, timing, floor: null });
}

/** Ten strata of twenty groups: invented counts of 40 to 400 with risks around 0.2. */
function panel(): readonly (readonly GroupCount[])[] {
  return Array.from({ length: 10 }, (_, stratum) =>
    Array.from({ length: 20 }, (_, level) => {
      const total = 40 + ((stratum * 97 + level * 61) % 361);
      return { events: 1 + Math.floor(total * (0.1 + 0.01 * level)), total };
    }),
  );
}

const light = <Member extends { readonly effort: string }>(
  register: Readonly<Record<string, Member>>,
): readonly Member[] => Object.values(register).filter(({ effort }) => effort === 'light');

const OF_RISKS = light<IntervalMethod<GroupCount>>(RISK_INTERVALS);
const OF_TESTS = light<FourfoldTest>(FOURFOLD_TESTS);
const OF_CONTRASTS = [
  RISK_DIFFERENCE_INTERVALS,
  RISK_RATIO_INTERVALS,
  ODDS_RATIO_INTERVALS,
].flatMap((register) => light<IntervalMethod<FourfoldTable>>(register));

function everyLightMethod(strata: readonly (readonly GroupCount[])[]): number {
  let done = 0;
  for (const [reference, ...levels] of strata) {
    for (const index of levels) {
      const table = { index, reference: reference! };
      for (const method of OF_RISKS) done += Number(method.interval(index, 0.95).ok);
      for (const method of OF_CONTRASTS) {
        done += Number(method.interval(table, 0.95).ok);
        method.pointOf?.(table);
      }
      for (const member of OF_TESTS) done += Number(member.test(table).ok);
    }
  }
  return done;
}

function tables(counts: readonly (readonly number[])[]): readonly FourfoldTable[] {
  return counts.map(([a = 0, m = 0, c = 0, n = 0]) => ({
    index: { events: a, total: m },
    reference: { events: c, total: n },
  }));
}
