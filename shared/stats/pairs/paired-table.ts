import type { EstimationIssue } from '../estimate';

/**
 * Pairs by who of the two members has the event: both, only the first, only the second, neither;
 * whole numbers. In a matched case-control study the members are case and control, and the event
 * is the exposure.
 */
export interface PairedTable {
  readonly both: number;
  readonly onlyFirst: number;
  readonly onlySecond: number;
  readonly neither: number;
}

/** How many pairs there are. */
export function pairsOf({ both, onlyFirst, onlySecond, neither }: PairedTable): number {
  return both + onlyFirst + onlySecond + neither;
}

/** How many more pairs in the first than in the second, over all pairs. */
export function pairedDifferenceOf(table: PairedTable): number {
  return (table.onlyFirst - table.onlySecond) / pairsOf(table);
}

/** Pairs with the event in the first member only, over those with it in the second only. */
export function matchedOddsRatioOf({ onlyFirst, onlySecond }: PairedTable): number {
  return onlyFirst / onlySecond;
}

/** Why pairs give no difference, or null: counts that are not whole, or no pairs. */
export function issueOfPairs(table: PairedTable): EstimationIssue | null {
  const counts = [table.both, table.onlyFirst, table.onlySecond, table.neither];
  if (!counts.every((count) => Number.isSafeInteger(count) && count >= 0)) {
    return { code: 'invalidCounts', facts: { group: 'pairs' } };
  }
  return pairsOf(table) === 0 ? { code: 'emptyGroup', facts: { group: 'pairs' } } : null;
}

/** The pairs' issue, or that of pairs whose members all agree: they test nothing. */
export function issueOfDiscordance(table: PairedTable): EstimationIssue | null {
  const agree = table.onlyFirst + table.onlySecond === 0;
  return issueOfPairs(table) ?? (agree ? { code: 'noDiscordantPairs' } : null);
}

/** The issue of discordance, or that of an infinite ratio: no pair with the second only. */
export function issueOfMatchedOddsRatio(table: PairedTable): EstimationIssue | null {
  const infinite = table.onlySecond === 0;
  return issueOfDiscordance(table) ?? (infinite ? { code: 'zeroCell' } : null);
}
