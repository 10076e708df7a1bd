import type { EstimationIssue } from '../estimate';
import type { FourfoldTable, StratifiedTable, TableStratum } from '../fourfold-table';

/** A stratum that an estimate or a test could not use, and why. */
export interface UnusedStratum {
  readonly stratumId: string;
  readonly issue: EstimationIssue;
}

/** The strata that carry information for one purpose, and those that do not. */
export interface StrataUsed {
  readonly used: StratifiedTable;
  readonly leftOut: readonly UnusedStratum[];
}

/** Parts strata by the issue that each has for a purpose. */
export function partStrata(
  strata: StratifiedTable,
  issueOf: (table: FourfoldTable) => EstimationIssue | null,
): StrataUsed {
  const used: TableStratum[] = [];
  const leftOut: UnusedStratum[] = [];
  for (const stratum of strata) {
    const issue = issueOf(stratum.table);
    if (issue) {
      leftOut.push({ stratumId: stratum.id, issue });
    } else {
      used.push(stratum);
    }
  }
  return { used, leftOut };
}

/** The issue of invalid counts in any stratum: that is no reason to leave one out quietly. */
export function invalidStratum(strata: StrataUsed): EstimationIssue | null {
  const invalid = strata.leftOut.find(({ issue }) => issue.code === 'invalidCounts');
  return invalid?.issue ?? null;
}

/** Sum of a number over strata. */
export function sumOver(strata: StratifiedTable, part: (table: FourfoldTable) => number): number {
  return strata.reduce((sum, stratum) => sum + part(stratum.table), 0);
}

/** Members of both groups. */
export function sizeOf(table: FourfoldTable): number {
  return table.index.total + table.reference.total;
}
