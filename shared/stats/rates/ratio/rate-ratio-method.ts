import type { EstimationIssue } from '../../estimate';
import { intervalMethod } from '../../intervals/interval-method';
import type { IntervalMethod, IntervalMethodParts } from '../../intervals/interval-method';
import { issueOfNoEvents, issueOfRates } from '../rate-count';
import type { RateTable } from '../rate-count';

/** An interval method for a rate ratio, index over reference; limits from 0 up. */
export function rateRatioMethod<Id extends string>(
  parts: IntervalMethodParts<RateTable, Id>,
  issueOf: (table: RateTable) => EstimationIssue | null = issueOfRateRatio,
): IntervalMethod<RateTable> & { readonly id: Id } {
  return intervalMethod(issueOf, parts);
}

/** Why a table gives no finite rate ratio: no person-time, or a reference without events. */
export function issueOfRateRatio(table: RateTable): EstimationIssue | null {
  const withoutEvents = table.reference.events === 0;
  return (
    issueOfRates(table) ?? issueOfNoEvents(table) ?? (withoutEvents ? zeroCell('reference') : null)
  );
}

/** The rate ratio's issue, or that of an index group without events. */
export function issueOfLogRateRatio(table: RateTable): EstimationIssue | null {
  return issueOfRateRatio(table) ?? (table.index.events === 0 ? zeroCell('index') : null);
}

function zeroCell(group: string): EstimationIssue {
  return { code: 'zeroCell', facts: { group } };
}
