import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { chiSquareOutcome } from '../chi-square-outcome';
import { marginsOf } from '../check-counts';
import type { EstimationIssue, TestOutcome } from '../estimate';
import { productDifference } from '../exact';
import type { FourfoldTable, StratifiedTable } from '../fourfold-table';
import { issueOfTest } from '../tests-of-association/fourfold-issue';
import { invalidStratum, partStrata, sizeOf, sumOver } from './strata-used';

/** Whether half an event is taken off the deviation before it is squared. */
export type ContinuityCorrection = 'none' | 'half';

/**
 * Cochran–Mantel–Haenszel test of conditional independence over strata.
 *
 * Takes events and totals by stratum; gives the chi-square statistic on 1 degree of freedom,
 * without continuity correction unless asked for. Strata with an empty group, or with events in
 * nobody or in everybody, carry no information; when none other is left: `noInformativeStratum`.
 *
 * Source: Cochran (1954) Biometrics 10:417-451; Mantel and Haenszel (1959).
 * Example: the admissions data give 1.5246, p = 0.2169.
 */
export function cochranMantelHaenszel(
  strata: StratifiedTable,
  correction: ContinuityCorrection = 'none',
): Result<TestOutcome, EstimationIssue> {
  const parted = partStrata(strata, issueOfTest);
  const invalid = invalidStratum(parted);
  if (invalid) {
    return failure(invalid);
  }
  if (parted.used.length === 0) {
    return failure({ code: 'noInformativeStratum', facts: { strata: strata.length } });
  }
  const statistic = statisticOf(parted.used, correction === 'half' ? 0.5 : 0);
  return success(chiSquareOutcome('cochranMantelHaenszel', statistic));
}

function statisticOf(strata: StratifiedTable, taken: number): number {
  const deviation = Math.abs(sumOver(strata, excessEvents));
  return Math.max(0, deviation - taken) ** 2 / sumOver(strata, variance);
}

/** Events of the index group beyond those expected under independence. */
function excessEvents(table: FourfoldTable): number {
  const { index, reference } = table;
  return (
    productDifference(index.events, reference.total, reference.events, index.total) / sizeOf(table)
  );
}

function variance(table: FourfoldTable): number {
  const { events, others, total } = marginsOf(table);
  return (
    (table.index.total / total) * (table.reference.total / total) * (events / (total - 1)) * others
  );
}
