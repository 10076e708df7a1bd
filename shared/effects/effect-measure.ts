import type { Result } from '#shared/core';
import type {
  Estimate,
  EstimationIssue,
  FourfoldTable,
  HomogeneityMethod,
  HomogeneityTest,
  IntervalMethod,
  PoolingMethod,
  StratifiedTable,
  UnusedStratum,
} from '#shared/stats';
import type { EffectMeasureId } from './measure-ids';
import type { StudyDesign } from './study-design';

/** Whether an effect is a difference of, or a ratio between, the two groups. */
export type EffectScale = 'difference' | 'ratio';

/** A value as whole numbers over one another; `denominator > 0`, the sign in the numerator. */
export interface ExactFraction {
  readonly numerator: number;
  readonly denominator: number;
}

/**
 * One way to say how much an outcome differs between two groups, index against reference. A member
 * of EFFECT_MEASURES; nouns and verbs are the wording's.
 */
export interface EffectMeasure {
  readonly id: EffectMeasureId;
  readonly scale: EffectScale;
  /** The value of no difference: 0 for differences, 1 for ratios. */
  readonly nullValue: number;
  readonly label: string;
  readonly abbreviation: string;
  /** Interval methods by id, in the order in which they are offered. */
  readonly intervals: Readonly<Record<string, IntervalMethod<FourfoldTable>>>;
  readonly defaultIntervalId: string;
  /** Whether a study of this design can give the measure. */
  givenBy(design: StudyDesign): boolean;
  /**
   * The estimate of one table with limits by a method of `intervals`. A method that is not there is
   * a bug; whether one is, `hasInterval` says.
   */
  estimate(
    table: FourfoldTable,
    intervalId: string,
    level: number,
  ): Result<Estimate, EstimationIssue>;
  /**
   * The sample's value as a fraction of whole numbers; null where their products pass 2^53, and
   * where the interval method of that id has its own point estimate, which is no fraction.
   */
  fraction(table: FourfoldTable, intervalId?: string): ExactFraction | null;
  /** Ways to pool the measure over strata by id, in the order in which they are offered. */
  readonly poolings: Readonly<Record<string, PoolingMethod>>;
  readonly defaultPoolingId: string;
  /**
   * The pooled estimate over strata, by the default way unless another of `poolings` is named. One
   * that is not there is a bug; whether one is, `hasPooling` says.
   */
  pooled(
    strata: StratifiedTable,
    level: number,
    poolingId?: string,
  ): Result<Estimate, EstimationIssue>;
  /** The strata that tell nothing about the pooled estimate, and why. */
  uninformative(strata: StratifiedTable, poolingId?: string): readonly UnusedStratum[];
  /** Tests of homogeneity over strata by id, in the order in which they are offered. */
  readonly homogeneities: Readonly<Record<string, HomogeneityMethod>>;
  readonly defaultHomogeneityId: string;
  /**
   * Whether the measure is the same in all strata, by the default test unless another of
   * `homogeneities` is named. One that is not there is a bug; `hasHomogeneity` says.
   */
  homogeneity(strata: StratifiedTable, homogeneityId?: string): HomogeneityTest;
  /** The estimate with index and reference exchanged; a ratio of 0 has none: `zeroCell`. */
  reverse(estimate: Estimate): Result<Estimate, EstimationIssue>;
}
