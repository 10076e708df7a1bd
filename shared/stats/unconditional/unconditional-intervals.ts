import { issueOfTable } from '../check-counts';
import type { EstimationIssue } from '../estimate';
import type { FourfoldTable } from '../fourfold-table';
import type { Limits } from '../intervals/interval-method';
import { issueOfSize } from '../method-effort';
import type { SizeCap } from '../method-effort';
import { riskDifferenceOf } from '../point-estimates';
import type { ExtremeSides } from './extreme-tables';
import { differences, logRatios } from './null-family';
import { unconditionalLowerLimit } from './unconditional-limit';

/**
 * The largest groups of exact unconditional intervals, and what to use beyond them: about 0.1 s
 * for 500 and 500, growing with the size to the power of 1.5. The score interval, whose statistic
 * they share, is then as good.
 */
export const UNCONDITIONAL_CAP: SizeCap = { groupCap: 500, instead: 'miettinenNurminen' };

/** Why a table gets no exact unconditional interval: an empty group, or one that is too large. */
export function issueOfUnconditional(table: FourfoldTable): EstimationIssue | null {
  return issueOfTable(table) ?? issueOfSize(table, UNCONDITIONAL_CAP);
}

/**
 * Exact unconditional limits of a risk difference by the score statistic: of two one-sided tests at
 * half of 1 - level each (`upper`), or of one two-sided test at 1 - level (`both`), whose accepted
 * differences may have gaps, so that these are their outermost.
 */
export function unconditionalDifferenceLimits(
  table: FourfoldTable,
  sides: ExtremeSides,
  level: number,
): Limits {
  const upper = lowerDifference(turned(table), sides, level);
  return [lowerDifference(table, sides, level), 0 - upper];
}

function lowerDifference(table: FourfoldTable, sides: ExtremeSides, level: number): number {
  const family = differences(table.index.total, table.reference.total);
  const range = [-1, riskDifferenceOf(table)] as const;
  return unconditionalLowerLimit(table, { family, sides }, range, tailOf(sides, level));
}

/**
 * Exact unconditional limits of a risk ratio by its score statistic, of two one-sided tests at half
 * of 1 - level each. Without events in the index group the lower limit is 0, without events in the
 * reference group the upper one infinite.
 */
export function unconditionalRatioLimits(table: FourfoldTable, level: number): Limits {
  return [lowerRatio(table, level), 1 / lowerRatio(turned(table), level)];
}

function lowerRatio(table: FourfoldTable, level: number): number {
  const { index, reference } = table;
  if (index.events === 0) {
    return 0;
  }
  const tail = tailOf('upper', level);
  const family = logRatios(index.total, reference.total);
  const range = [Math.log(tail / (2 * index.total)), farthestLogRatio(table, tail)] as const;
  return Math.exp(unconditionalLowerLimit(table, { family, sides: 'upper' }, range, tail));
}

/**
 * Where the search ends: at the estimate; for an infinite one at a ratio so large that a reference
 * group without events is all but certain, which no test refuses. It begins where even one event
 * in the index group is too improbable.
 */
function farthestLogRatio({ index, reference }: FourfoldTable, tail: number): number {
  return reference.events === 0
    ? Math.log((2 * reference.total) / tail)
    : Math.log(index.events / index.total) - Math.log(reference.events / reference.total);
}

function tailOf(sides: ExtremeSides, level: number): number {
  return sides === 'both' ? 1 - level : (1 - level) / 2;
}

function turned({ index, reference }: FourfoldTable): FourfoldTable {
  return { index: reference, reference: index };
}
