import type { Limits } from '../../intervals/interval-method';
import { intervalMethod } from '../../intervals/interval-method';
import { zeroOfDecreasing } from '../../intervals/score/bisection';
import { standardised } from '../../intervals/score/standardised';
import type { PairedTable } from '../paired-table';
import { issueOfPairs, pairedDifferenceOf, pairsOf } from '../paired-table';

/**
 * Tango's score interval for a difference of paired proportions, first minus second: every
 * difference that the score test does not refuse.
 *
 * Takes the pairs' counts; gives proportions in [-1, 1]. Defined where all members agree; no pairs
 * give `emptyGroup`.
 *
 * Source: Tango (1998) Statistics in Medicine 17:891-908.
 * Example: 1 both, 1 only first, 7 only second, 12 neither at level 0.95 give -0.517 to -0.026.
 */
export const tango = intervalMethod(issueOfPairs, {
  id: 'tango',
  label: 'Tango score for pairs',
  shortLabel: 'Tango',
  citation:
    'Tango T. Equivalence test and confidence interval for the difference in proportions for the ' +
    'paired-sample design. Statistics in Medicine 1998;17:891-908.',
  limits(table: PairedTable, z): Limits {
    const difference = pairedDifferenceOf(table);
    return [
      zeroOfDecreasing((tested) => score(table, tested) - z, -1, difference),
      zeroOfDecreasing((tested) => score(table, tested) + z, difference, 1),
    ];
  },
});

/** Observed less tested difference over its standard error at the tested one. */
function score(table: PairedTable, tested: number): number {
  const total = pairsOf(table);
  const deviation = table.onlyFirst - table.onlySecond - total * tested;
  const variance = total * (2 * constrainedSecond(table, tested) + tested * (1 - tested));
  return standardised(deviation, variance);
}

/** The most likely share of pairs with the event in the second only, under a tested difference. */
function constrainedSecond(table: PairedTable, tested: number): number {
  const { onlyFirst, onlySecond } = table;
  const square = 2 * pairsOf(table);
  const linear = (square - onlyFirst + onlySecond) * tested - onlyFirst - onlySecond;
  const constant = -onlySecond * tested * (1 - tested);
  const root = Math.sqrt(Math.max(0, linear * linear - 4 * square * constant));
  return linear > 0 ? (-2 * constant) / (linear + root) : (root - linear) / (2 * square);
}
