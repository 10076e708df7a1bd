import type { Issue } from '#shared/core';

/** Why an analysis cannot be framed, counted or computed. */
export type AnalysisIssueCode =
  /** A column of the specification is not in the code book; facts: columnId, role. */
  | 'columnMissing'
  /** A column has neither levels nor bands; facts: columnId, role. */
  | 'columnWithoutLevels'
  /** One column has two roles; facts: columnId. */
  | 'columnUsedTwice'
  /** A level is not among those that the analysis keeps; facts: columnId, levelId, role. */
  | 'levelMissing'
  /** No level counts as the event; facts: columnId. */
  | 'noEventLevel'
  /** Every level counts as the event; facts: columnId. */
  | 'everyLevelIsEvent'
  /** The exposure keeps fewer than two levels; facts: columnId, levels. */
  | 'fewerThanTwoExposureLevels'
  /** A level has no trend score, or not a finite one; facts: levelId. */
  | 'trendScoreMissing'
  /** No interval method has this id; facts: estimand, methodId. */
  | 'unknownMethod'
  /** The confidence level does not lie strictly between 0 and 1; facts: level. */
  | 'invalidLevel'
  /** The tally counts other columns or levels than the frame names; facts: columnId, levelId. */
  | 'tallyDoesNotFit'
  /** A cell of the tally is no whole number of records; facts: count. */
  | 'invalidCounts';

/** An expected failure of an analysis as a whole. */
export type AnalysisIssue = Issue<AnalysisIssueCode>;
