import { cellsOf } from '../check-counts';
import { criticalValue, hypergeometricSupport } from '../distributions';
import type { FourfoldTable } from '../fourfold-table';
import type { Limits } from '../intervals/interval-method';
import { oddsRatioOf } from '../point-estimates';
import { urnOf } from '../urn-of';
import { conditionalCounts } from './conditional-counts';
import { RANGE, zeroOfIncreasing } from './newton';
import { meanDistance } from './tail-sums';

/** How a limit's tail counts the observed number: whole for exact limits, half for mid-p. */
export type ShareOfObserved = 1 | 0.5;

/**
 * The odds ratio at which the index group's expected events, given all margins, are the observed
 * ones: 0 at the lower end of their support, infinite at the upper, NaN where nothing else could
 * have been observed.
 *
 * Source: Birch (1964) Journal of the Royal Statistical Society B 26:313-324.
 * Example: 3/4 against 1/4 gives 6.4083.
 */
export function conditionalOddsRatioOf(table: FourfoldTable): number {
  const { smallest, largest } = supportOf(table);
  const observed = table.index.events;
  if (observed === smallest || observed === largest) {
    return smallest === largest ? NaN : observed === smallest ? 0 : Infinity;
  }
  const counts = conditionalCounts(table);
  const zero = zeroOfIncreasing(
    (logRatio) => meanDistance(counts(logRatio)),
    Math.log(oddsRatioOf(table)),
    RANGE,
  );
  return Math.exp(zero);
}

/**
 * Limits of an odds ratio from the two tails of the index group's events given all margins, each at
 * half of 1 - level. At the lower end of the support the lower limit is 0, at the upper end the
 * upper one infinite.
 */
export function conditionalLimits(
  table: FourfoldTable,
  level: number,
  shareOfObserved: ShareOfObserved,
): Limits {
  const { index, reference } = table;
  const turned = { index: reference, reference: index };
  return [
    lowerLimit(table, level, shareOfObserved),
    1 / lowerLimit(turned, level, shareOfObserved),
  ];
}

function lowerLimit(table: FourfoldTable, level: number, shareOfObserved: number): number {
  if (table.index.events === supportOf(table).smallest) {
    return 0;
  }
  const counts = conditionalCounts(table);
  const logTail = Math.log((1 - level) / 2);
  const zero = zeroOfIncreasing(
    (logRatio) => {
      const { at, above, momentBelow, momentAbove } = counts(logRatio);
      const tail = above + shareOfObserved * at;
      const slope = momentAbove / tail - (momentBelow + momentAbove);
      return { value: Math.log(tail) - logTail, slope };
    },
    roughLowerLimit(table, level),
    RANGE,
  );
  return Math.exp(zero);
}

/** Where the search begins; the halves keep it finite and leave no trace in the limit. */
function roughLowerLimit(table: FourfoldTable, level: number): number {
  const { indexEvents, indexOthers, referenceEvents, referenceOthers } = cellsOf(table);
  const [a, b, c, d] = [
    indexEvents + 0.5,
    indexOthers + 0.5,
    referenceEvents + 0.5,
    referenceOthers + 0.5,
  ];
  const error = Math.sqrt(1 / a + 1 / b + 1 / c + 1 / d);
  return Math.log(a / b) - Math.log(c / d) - criticalValue(level) * error;
}

function supportOf(table: FourfoldTable): { smallest: number; largest: number } {
  return hypergeometricSupport(urnOf(table));
}
