import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import type { EstimationIssue, TestOutcome } from '../../estimate';
import type { FourfoldTable } from '../../fourfold-table';
import { issueOfSize } from '../../method-effort';
import type { SizeCap } from '../../method-effort';
import { largestProbability, tableMask } from '../../unconditional';
import { issueOfTest } from '../fourfold-issue';

/** The largest groups of exact unconditional tests, and what to use beyond them. */
export const TEST_CAP: SizeCap = { groupCap: 500, instead: 'fisherMidP' };

/**
 * An exact unconditional test: the largest probability, over all risks that the two groups may
 * share, of the tables that are at least as extreme as the observed one.
 */
export function unconditionalTest(
  method: string,
  table: FourfoldTable,
  isExtreme: (table: FourfoldTable) => (indexEvents: number, referenceEvents: number) => boolean,
): Result<TestOutcome, EstimationIssue> {
  const issue = issueOfTest(table) ?? issueOfSize(table, TEST_CAP);
  if (issue) {
    return failure(issue);
  }
  const mask = tableMask(table.index.total, table.reference.total, isExtreme(table));
  const pValue = largestProbability(mask);
  return success({ method, statistic: null, degreesOfFreedom: null, pValue });
}
