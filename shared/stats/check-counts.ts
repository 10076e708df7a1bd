import type { EstimationIssue } from './estimate';
import type { FourfoldTable, GroupCount } from './fourfold-table';

/** Why one group gives no estimate, or null. */
export function issueOfGroup(count: GroupCount, group: string): EstimationIssue | null {
  const whole = Number.isSafeInteger(count.events) && Number.isSafeInteger(count.total);
  if (!whole || count.events < 0 || count.events > count.total) {
    return { code: 'invalidCounts', facts: { group } };
  }
  return count.total === 0 ? { code: 'emptyGroup', facts: { group } } : null;
}

/** Why a fourfold table gives no contrast, or null; an empty group comes before all else. */
export function issueOfTable(table: FourfoldTable): EstimationIssue | null {
  return issueOfGroup(table.index, 'index') ?? issueOfGroup(table.reference, 'reference');
}

/** Why a confidence level cannot be used, or null. Levels lie strictly between 0 and 1. */
export function issueOfLevel(level: number): EstimationIssue | null {
  return level > 0 && level < 1 ? null : { code: 'invalidLevel', facts: { level } };
}

/** The four cells: events and others, of index and reference. */
export interface FourfoldCells {
  readonly indexEvents: number;
  readonly indexOthers: number;
  readonly referenceEvents: number;
  readonly referenceOthers: number;
}

/** Spells out the four cells of a table. */
export function cellsOf(table: FourfoldTable): FourfoldCells {
  return {
    indexEvents: table.index.events,
    indexOthers: table.index.total - table.index.events,
    referenceEvents: table.reference.events,
    referenceOthers: table.reference.total - table.reference.events,
  };
}

/** Marginal totals: of events, of others, of all. */
export interface FourfoldMargins {
  readonly events: number;
  readonly others: number;
  readonly total: number;
}

/** The totals of a table over both groups. */
export function marginsOf(table: FourfoldTable): FourfoldMargins {
  const events = table.index.events + table.reference.events;
  const total = table.index.total + table.reference.total;
  return { events, others: total - events, total };
}
