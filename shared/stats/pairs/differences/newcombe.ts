import { productDifference } from '../../exact';
import type { Limits } from '../../intervals/interval-method';
import { intervalMethod } from '../../intervals/interval-method';
import { wilsonLimits } from '../../intervals/risk/wilson';
import type { PairedTable } from '../paired-table';
import { issueOfPairs, pairedDifferenceOf, pairsOf } from '../paired-table';

/**
 * Newcombe's interval for a difference of paired proportions, first minus second: the two Wilson
 * intervals, put together under the members' correlation.
 *
 * Takes the pairs' counts; gives proportions in [-1, 1]. Defined where all members agree; no pairs
 * give `emptyGroup`.
 *
 * Source: Newcombe (1998) Statistics in Medicine 17:2635-2650, method 10.
 * Example: 20 both, 12 only first, 2 only second, 16 neither at level 0.95 give 0.0562 to 0.3292.
 */
export const newcombe = intervalMethod(issueOfPairs, {
  id: 'newcombePaired',
  label: 'Newcombe hybrid score for pairs',
  shortLabel: 'Newcombe (pairs)',
  citation:
    'Newcombe RG. Improved confidence intervals for the difference between binomial proportions ' +
    'based on paired data. Statistics in Medicine 1998;17:2635-2650, method 10.',
  limits(table: PairedTable, z): Limits {
    const total = pairsOf(table);
    const correlation = correctedCorrelation(table);
    const first = margins(table.both + table.onlyFirst, total, z);
    const second = margins(table.both + table.onlySecond, total, z);
    const difference = pairedDifferenceOf(table);
    return [
      difference - combined(first.below, second.above, correlation),
      difference + combined(first.above, second.below, correlation),
    ];
  },
});

/** How far a member's Wilson limits lie from its risk. */
function margins(
  events: number,
  total: number,
  z: number,
): { readonly below: number; readonly above: number } {
  const [lower, upper] = wilsonLimits({ events, total }, z);
  return { below: events / total - lower, above: upper - events / total };
}

function combined(one: number, other: number, correlation: number): number {
  return Math.sqrt(Math.max(0, one * one - 2 * correlation * one * other + other * other));
}

/** Phi with half a pair taken off a positive numerator, but not below 0; 0 with an empty margin. */
function correctedCorrelation({ both, onlyFirst, onlySecond, neither }: PairedTable): number {
  const total = both + onlyFirst + onlySecond + neither;
  const spread =
    Math.sqrt(both + onlyFirst) *
    Math.sqrt(onlySecond + neither) *
    Math.sqrt(both + onlySecond) *
    Math.sqrt(onlyFirst + neither);
  if (spread === 0) {
    return 0;
  }
  const product = productDifference(both, neither, onlyFirst, onlySecond);
  return (product > 0 ? Math.max(0, product - total / 2) : product) / spread;
}
