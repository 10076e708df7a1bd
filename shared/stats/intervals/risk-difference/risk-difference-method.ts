import { issueOfTable } from '../../check-counts';
import type { EstimationIssue } from '../../estimate';
import type { FourfoldTable } from '../../fourfold-table';
import { intervalMethod } from '../interval-method';
import type { IntervalMethod, IntervalMethodParts } from '../interval-method';

/** An interval method for a risk difference, index minus reference; limits in [-1, 1]. */
export function riskDifferenceMethod<Id extends string>(
  parts: IntervalMethodParts<FourfoldTable, Id>,
  issueOf: (table: FourfoldTable) => EstimationIssue | null = issueOfTable,
): IntervalMethod<FourfoldTable> & { readonly id: Id } {
  return intervalMethod(issueOf, parts);
}
