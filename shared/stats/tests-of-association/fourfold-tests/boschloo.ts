import { hypergeometricSupport } from '../../distributions';
import type { FourfoldTable } from '../../fourfold-table';
import type { FourfoldTest } from './fourfold-test';
import { compareFractions, fisherFraction, fisherPValues } from './fisher-p-values';
import { TEST_CAP, unconditionalTest } from './unconditional-test';

/**
 * Boschloo's exact unconditional test, two-sided, with tables in the order of Fisher's two-sided
 * p-value, itself by the probability of tables; twice the smaller one-sided p would be another
 * test. Never less powerful than Fisher's. Tables with the observed p-value count; near values are
 * compared as fractions of whole numbers.
 *
 * Takes events and totals of two groups of up to 500; gives no statistic.
 *
 * Source: Boschloo (1970) Statistica Neerlandica 24:1-35.
 * Example: 7/12 against 1/12 gives p = 0.0103.
 */
export const boschloo = {
  id: 'boschloo',
  label: "Boschloo's exact unconditional test, two-sided by Fisher's two-sided p-value",
  shortLabel: "Boschloo's exact",
  citation:
    'Boschloo RD. Raised conditional level of significance for the 2 × 2-table when testing the ' +
    'equality of two probabilities. Statistica Neerlandica 1970;24:1-35.',
  effort: 'heavy',
  groupCap: TEST_CAP.groupCap,
  test: (table) => unconditionalTest('boschloo', table, hasAsSmallP),
} as const satisfies FourfoldTest;

/** Values nearer than this, relative to their size, are compared as fractions. */
const NEAR = 1e-9;

function hasAsSmallP({ index, reference }: FourfoldTable): (a: number, c: number) => boolean {
  const urnOf = (drawn: number): { marked: number; unmarked: number; drawn: number } => ({
    marked: index.total,
    unmarked: reference.total,
    drawn,
  });
  const byEvents = Array.from({ length: index.total + reference.total + 1 }, (_, drawn) => ({
    smallest: hypergeometricSupport(urnOf(drawn)).smallest,
    pValues: fisherPValues(urnOf(drawn)),
  }));
  const pValueOf = (a: number, c: number): number => {
    const { smallest = 0, pValues = [] } = byEvents[a + c] ?? {};
    return pValues[a - smallest] ?? 1;
  };
  const observed = pValueOf(index.events, reference.events);
  const exact = fisherFraction(index.events, urnOf(index.events + reference.events));
  return (a, c) => {
    const pValue = pValueOf(a, c);
    return Math.abs(pValue - observed) > NEAR * observed
      ? pValue < observed
      : compareFractions(fisherFraction(a, urnOf(a + c)), exact) <= 0;
  };
}
