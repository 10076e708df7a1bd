import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { chiSquareOutcome } from '../../chi-square-outcome';
import { cellsOf, marginsOf } from '../../check-counts';
import type { EstimationIssue, TestOutcome } from '../../estimate';
import { productDifference } from '../../exact';
import type { FourfoldTable } from '../../fourfold-table';
import { issueOfTest } from '../fourfold-issue';
import type { FourfoldTest } from './fourfold-test';

/**
 * The likelihood ratio test of a fourfold table: twice the sum of observed times the logarithm of
 * observed over expected. An empty cell adds nothing.
 *
 * Takes events and totals of two groups of any size; gives the statistic on 1 degree of freedom,
 * good to 1e-12 relative also close to independence, where the plain sum cancels.
 *
 * Source: Wilks (1935) Annals of Mathematical Statistics 6:190-196.
 * Example: 3/4 against 1/4 gives 2.093, p = 0.1480.
 */
export const likelihoodRatio = {
  id: 'likelihoodRatio',
  label: 'Likelihood ratio chi-square test',
  shortLabel: 'likelihood ratio',
  citation:
    'Wilks SS. The likelihood test of independence in contingency tables. ' +
    'Annals of Mathematical Statistics 1935;6:190-196.',
  effort: 'light',
  groupCap: null,
  test: twiceLogRatio,
} as const satisfies FourfoldTest;

function twiceLogRatio(table: FourfoldTable): Result<TestOutcome, EstimationIssue> {
  const issue = issueOfTest(table);
  if (issue) {
    return failure(issue);
  }
  const { indexEvents, indexOthers, referenceEvents, referenceOthers } = cellsOf(table);
  const { events, others, total } = marginsOf(table);
  const apart = productDifference(indexEvents, referenceOthers, indexOthers, referenceEvents);
  const excess = apart / total;
  const shares = [events / total, others / total] as const;
  const statistic =
    2 *
    (part(table.index.total * shares[0], excess) +
      part(table.index.total * shares[1], -excess) +
      part(table.reference.total * shares[0], -excess) +
      part(table.reference.total * shares[1], excess));
  return success(chiSquareOutcome('likelihoodRatio', statistic));
}

/**
 * A cell's observed × log(observed / expected) less observed minus expected. The latter cancel over
 * the table, and without them every cell adds something positive.
 */
function part(expected: number, excess: number): number {
  return expected * convexLog(Math.max(-1, excess / expected));
}

/** (1 + x) log(1 + x) - x, by its series near 0. */
function convexLog(x: number): number {
  if (x === -1) {
    return 1;
  }
  if (Math.abs(x) > 0.05) {
    return (1 + x) * Math.log1p(x) - x;
  }
  let sum = 0;
  let power = -x;
  for (let order = 2; ; order += 1) {
    power *= -x;
    const next = sum + power / (order * (order - 1));
    if (next === sum) {
      return sum;
    }
    sum = next;
  }
}
