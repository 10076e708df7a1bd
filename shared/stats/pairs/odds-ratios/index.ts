import { exact } from './exact';
import { midP } from './mid-p';
import { wilson } from './wilson';

/** Intervals for a matched odds ratio, in the order in which they are offered. */
export const MATCHED_ODDS_RATIO_INTERVALS = {
  matchedExact: exact,
  matchedMidP: midP,
  matchedWilson: wilson,
} as const;

/** Id of an interval for a matched odds ratio. */
export type MatchedOddsRatioIntervalId = keyof typeof MATCHED_ODDS_RATIO_INTERVALS;
