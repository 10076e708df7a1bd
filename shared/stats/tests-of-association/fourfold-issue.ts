import { issueOfTable, marginsOf } from '../check-counts';
import type { EstimationIssue } from '../estimate';
import type { FourfoldTable } from '../fourfold-table';

/** Why a fourfold table gives no test, or null: an empty group, or events in nobody or in all. */
export function issueOfTest(table: FourfoldTable): EstimationIssue | null {
  const issue = issueOfTable(table);
  if (issue) {
    return issue;
  }
  const { events, others } = marginsOf(table);
  return events === 0 || others === 0 ? { code: 'emptyMargin', facts: { events, others } } : null;
}
