import type { FourfoldTable } from '../../fourfold-table';
import type { FourfoldTest } from './fourfold-test';
import { TEST_CAP, unconditionalTest } from './unconditional-test';

/**
 * Barnard's exact unconditional test, two-sided, with tables in the order of the absolute score
 * statistic (the difference of risks over its standard error at the pooled risk): Suissa and
 * Shuster's form of it. Tables as extreme as the observed one count; ties are decided with whole
 * numbers.
 *
 * Takes events and totals of two groups of up to 500; gives no statistic.
 *
 * Source: Barnard (1947) Biometrika 34:123-138; Suissa and Shuster (1985) Journal of the Royal
 * Statistical Society A 148:317-327.
 * Example: 3/4 against 1/4 gives p = 0.28906.
 */
export const barnard = {
  id: 'barnard',
  label: "Barnard's exact unconditional test, two-sided by the score statistic",
  shortLabel: "Barnard's exact",
  citation:
    'Suissa S, Shuster JJ. Exact unconditional sample sizes for the 2 × 2 binomial trial. ' +
    'Journal of the Royal Statistical Society, Series A 1985;148:317-327, after Barnard GA. ' +
    'Significance tests for 2 × 2 tables. Biometrika 1947;34:123-138.',
  effort: 'heavy',
  groupCap: TEST_CAP.groupCap,
  test: (table) => unconditionalTest('barnard', table, isAsFarApart),
} as const satisfies FourfoldTest;

/** Numbers nearer than this, relative to their size, are compared as whole numbers. */
const NEAR = 1e-12;

/**
 * Whether tables have a squared score at least as large: (ad - bc)² over events times others, which
 * is all of it that changes from table to table of the same groups.
 */
function isAsFarApart(observed: FourfoldTable): (index: number, reference: number) => boolean {
  const { index, reference } = observed;
  const apartOf = (indexEvents: number, referenceEvents: number): number =>
    Math.abs(indexEvents * reference.total - referenceEvents * index.total);
  const poolOf = (events: number): number => events * (index.total + reference.total - events);
  const apart = apartOf(index.events, reference.events);
  const pool = poolOf(index.events + reference.events);
  return (indexEvents, referenceEvents) => {
    const otherApart = apartOf(indexEvents, referenceEvents);
    const otherPool = poolOf(indexEvents + referenceEvents);
    return otherPool === 0
      ? apart === 0
      : isAtLeast([otherApart, otherApart, pool], [apart, apart, otherPool]);
  };
}

type Factors = readonly [number, number, number];

/** Whether one product of whole numbers is at least another, exactly where they are near. */
function isAtLeast(one: Factors, other: Factors): boolean {
  const [left, right] = [one, other].map(([a, b, c]) => a * b * c) as [number, number];
  if (Math.abs(left - right) > NEAR * Math.max(left, right)) {
    return left > right;
  }
  const exact = ([a, b, c]: Factors): bigint => BigInt(a) * BigInt(b) * BigInt(c);
  return exact(one) >= exact(other);
}
