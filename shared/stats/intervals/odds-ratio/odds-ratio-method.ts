import { cellsOf, issueOfTable, marginsOf } from '../../check-counts';
import type { EstimationIssue } from '../../estimate';
import type { FourfoldTable } from '../../fourfold-table';
import { intervalMethod } from '../interval-method';
import type { IntervalMethod, IntervalMethodParts } from '../interval-method';

/** An interval method for an odds ratio, index over reference; limits from 0 up. */
export function oddsRatioMethod<Id extends string>(
  parts: IntervalMethodParts<FourfoldTable, Id>,
  issueOf: (table: FourfoldTable) => EstimationIssue | null = issueOfOddsRatio,
): IntervalMethod<FourfoldTable> & { readonly id: Id } {
  return intervalMethod(issueOf, parts);
}

/** Why a table tells nothing of an odds ratio: an empty group, or events in nobody or in all. */
export function issueOfOddsRatio(table: FourfoldTable): EstimationIssue | null {
  const { events, others } = marginsOf(table);
  return issueOfTable(table) ?? (events === 0 || others === 0 ? { code: 'zeroCell' } : null);
}

/** The odds ratio's issue, or that of any zero cell. */
export function issueOfLogOddsRatio(table: FourfoldTable): EstimationIssue | null {
  const anyZero = Object.values(cellsOf(table)).includes(0);
  return issueOfTable(table) ?? (anyZero ? { code: 'zeroCell' } : null);
}
