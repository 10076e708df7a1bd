import type { Result } from '#shared/core';
import type { FactorLevel } from '#shared/code-book';
import type { EffectMeasureId, StudyDesign } from '#shared/effects';
import type {
  Estimate,
  EstimationIssue,
  GroupCount,
  Interaction,
  TestOutcome,
} from '#shared/stats';
import type { LeftOut } from '#shared/tally';
import type { AnalysisSpecification } from './specification';

/** Words of a study's outcome. */
export interface OutcomeWords {
  readonly id: string;
  readonly noun: string;
  readonly verbPhrase: string;
  /** For instance "12 months"; null where time has no meaning (cross-section, case-control). */
  readonly timeFrame: string | null;
  readonly desirability: 'harmful' | 'beneficial';
}

/** The words and order that a result was computed under; makes it self-contained. */
export interface ResultFrame {
  readonly design: StudyDesign;
  /** Who the records are, in the plural: "workers", "guests", "patients". */
  readonly peopleNoun: string;
  readonly population: string;
  readonly outcome: OutcomeWords;
  readonly exposure: {
    readonly columnId: string;
    readonly label: string;
    readonly sentenceLabel: string;
    readonly unit: string | null;
    readonly ordered: boolean;
    readonly levels: readonly FactorLevel[];
    readonly referenceLevelId: string;
    /** The column's pattern for the people at a level; null leaves it to the phrasebook. */
    readonly groupPattern?: string | null;
  };
  /** One entry per combination of the stratifying columns; empty for an unstratified analysis. */
  readonly strata: readonly FactorLevel[];
  readonly strataLabel: string | null;
}

/** Counts and occurrence of one exposure level. */
export interface LevelResult {
  readonly levelId: string;
  readonly count: GroupCount;
  readonly risk: Result<Estimate, EstimationIssue>;
}

/** One level against the reference. */
export interface ContrastResult {
  readonly indexLevelId: string;
  readonly referenceLevelId: string;
  readonly measures: Readonly<Record<EffectMeasureId, Result<Estimate, EstimationIssue>>>;
  readonly pearson: Result<TestOutcome, EstimationIssue>;
  readonly fisher: Result<TestOutcome, EstimationIssue>;
  /** By the test that the specification chose, where it chose one. */
  readonly test?: Result<TestOutcome, EstimationIssue>;
}

/** All levels within one stratum, or over all records (crude, `stratumId` null). */
export interface LayerResult {
  readonly stratumId: string | null;
  readonly total: GroupCount;
  readonly levels: readonly LevelResult[];
  readonly contrasts: readonly ContrastResult[];
  /** Pearson chi-square over all levels. */
  readonly association: Result<TestOutcome, EstimationIssue>;
  readonly trend: Result<TestOutcome, EstimationIssue>;
}

/** A stratum that a pooled estimate left out, and why. */
export interface StratumLeftOut {
  readonly stratumId: string;
  readonly issue: EstimationIssue;
}

/** One level against the reference, pooled over strata. */
export interface PooledContrastResult {
  readonly indexLevelId: string;
  readonly referenceLevelId: string;
  readonly measures: Readonly<Record<EffectMeasureId, Result<Estimate, EstimationIssue>>>;
  readonly homogeneity: Readonly<Record<EffectMeasureId, Result<TestOutcome, EstimationIssue>>>;
  readonly conditionalIndependence: Result<TestOutcome, EstimationIssue>;
  /**
   * How the effect differs between two strata, the second against the first: a difference of
   * differences, ratios of ratios. Only there where there are exactly two strata.
   */
  readonly interaction?: Readonly<Record<EffectMeasureId, Result<Interaction, EstimationIssue>>>;
  /**
   * The relative excess risk due to interaction of an exposure of two levels and a stratifying
   * factor of two, whose first level is the reference. Only there where there are just those.
   */
  readonly excessRisk?: Result<Interaction, EstimationIssue>;
  /** Strata that no pooled number of the contrast could use (an empty group, for instance). */
  readonly leftOut: readonly StratumLeftOut[];
  /** Strata that tell nothing about one measure's pooled estimate; includes those of `leftOut`. */
  readonly measureLeftOut?: Readonly<Record<EffectMeasureId, readonly StratumLeftOut[]>>;
  /** Strata that one measure's test of homogeneity could not use. */
  readonly homogeneityLeftOut?: Readonly<Record<EffectMeasureId, readonly StratumLeftOut[]>>;
}

/**
 * Everything that an analysis says, with the counts it used. Immutable once stored; finite numbers
 * only (what is undefined is an issue), so that it survives JSON unchanged.
 */
export interface AnalysisResult {
  readonly schemaVersion: 1;
  readonly engineVersion: string;
  readonly specification: AnalysisSpecification;
  readonly frame: ResultFrame;
  readonly counted: number;
  readonly restricted: number;
  readonly leftOut: readonly LeftOut[];
  readonly crude: LayerResult;
  readonly strata: readonly LayerResult[];
  readonly pooled: readonly PooledContrastResult[];
}
