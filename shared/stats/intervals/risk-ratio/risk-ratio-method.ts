import { issueOfTable } from '../../check-counts';
import type { EstimationIssue } from '../../estimate';
import type { FourfoldTable } from '../../fourfold-table';
import { intervalMethod } from '../interval-method';
import type { IntervalMethod, IntervalMethodParts } from '../interval-method';

/** An interval method for a risk ratio, index over reference; limits from 0 up. */
export function riskRatioMethod<Id extends string>(
  parts: IntervalMethodParts<FourfoldTable, Id>,
  issueOf: (table: FourfoldTable) => EstimationIssue | null = issueOfRiskRatio,
): IntervalMethod<FourfoldTable> & { readonly id: Id } {
  return intervalMethod(issueOf, parts);
}

/** Why a table tells nothing of a risk ratio: an empty group, or no events at all. */
export function issueOfRiskRatio(table: FourfoldTable): EstimationIssue | null {
  const noEvents = table.index.events + table.reference.events === 0;
  return issueOfTable(table) ?? (noEvents ? zeroCell('reference') : null);
}

/** The risk ratio's issue, or that of either group without events. */
export function issueOfLogRiskRatio(table: FourfoldTable): EstimationIssue | null {
  return (
    issueOfTable(table) ??
    (table.reference.events === 0 ? zeroCell('reference') : null) ??
    (table.index.events === 0 ? zeroCell('index') : null)
  );
}

function zeroCell(group: string): EstimationIssue {
  return { code: 'zeroCell', facts: { group } };
}
