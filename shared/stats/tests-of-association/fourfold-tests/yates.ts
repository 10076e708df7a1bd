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
 * Pearson's chi-square test with Yates' continuity correction: |ad - bc| is lessened by half the
 * total, but not below 0.
 *
 * Takes events and totals of two groups of any size; gives the statistic on 1 degree of freedom.
 *
 * Source: Yates (1934) Supplement to the Journal of the Royal Statistical Society 1:217-235.
 * Example: 3/4 against 1/4 gives 0.500, p = 0.4795.
 */
export const yates = {
  id: 'yates',
  label: "Chi-square test with Yates' continuity correction",
  shortLabel: 'chi-square (Yates)',
  citation:
    'Yates F. Contingency tables involving small numbers and the χ² test. ' +
    'Supplement to the Journal of the Royal Statistical Society 1934;1:217-235.',
  effort: 'light',
  groupCap: null,
  test: corrected,
} as const satisfies FourfoldTest;

function corrected(table: FourfoldTable): Result<TestOutcome, EstimationIssue> {
  const issue = issueOfTest(table);
  if (issue) {
    return failure(issue);
  }
  const { indexEvents, indexOthers, referenceEvents, referenceOthers } = cellsOf(table);
  const { events, others, total } = marginsOf(table);
  const apart = productDifference(indexEvents, referenceOthers, indexOthers, referenceEvents);
  const lessened = Math.max(0, Math.abs(apart) - total / 2);
  const byGroups = lessened / table.index.total / table.reference.total;
  const byOutcome = lessened / events / others;
  const statistic = byGroups * byOutcome * total;
  return success(chiSquareOutcome('yates', statistic));
}
