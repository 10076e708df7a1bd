import type { Issue } from '#shared/core';

/** Why a statistic is not defined for these counts. */
export type EstimationIssueCode =
  | 'emptyGroup'
  | 'zeroCell'
  | 'emptyMargin'
  | 'noInformativeStratum'
  | 'fewerThanTwoStrata'
  | 'fewerThanTwoLevels'
  | 'notGivenByDesign'
  | 'notOrdered'
  | 'invalidCounts'
  | 'invalidWeights'
  | 'emptyGroupInStratum'
  | 'noDiscordantPairs'
  | 'protectiveFactor'
  | 'invalidLevel'
  | 'tooLarge'
  | 'noEvents'
  | 'adjustedInCrudeFormula';

/** An expected failure of an estimate or a test. */
export type EstimationIssue = Issue<EstimationIssueCode>;

/** Confidence limits on the scale of the estimand; `lower <= upper`. */
export interface Interval {
  readonly lower: number;
  readonly upper: number;
  readonly level: number;
  readonly method: string;
}

/** A point estimate with its interval. */
export interface Estimate {
  readonly value: number;
  readonly interval: Interval;
}

/** A test's outcome; `degreesOfFreedom` is null for an exact test. */
export interface TestOutcome {
  readonly method: string;
  readonly statistic: number | null;
  readonly degreesOfFreedom: number | null;
  readonly pValue: number;
}
