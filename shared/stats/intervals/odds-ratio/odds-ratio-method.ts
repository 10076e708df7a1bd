import { cellsOf, issueOfTable } from '../../check-counts';
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

/** Why a table gives no finite odds ratio: an empty group, or a zero cell below the line. */
export function issueOfOddsRatio(table: FourfoldTable): EstimationIssue | null {
  const cells = cellsOf(table);
  const infinite = cells.indexOthers === 0 || cells.referenceEvents === 0;
  return issueOfTable(table) ?? (infinite ? { code: 'zeroCell' } : null);
}

/** The odds ratio's issue, or that of any other zero cell. */
export function issueOfLogOddsRatio(table: FourfoldTable): EstimationIssue | null {
  const anyZero = Object.values(cellsOf(table)).includes(0);
  return issueOfTable(table) ?? (anyZero ? { code: 'zeroCell' } : null);
}
