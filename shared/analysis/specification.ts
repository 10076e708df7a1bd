import type { EffectMeasureId } from '#shared/effects';
import type { Restriction } from '#shared/tally';

/** How several strata become one number. */
export type Adjustment = 'crude' | 'mantelHaenszel';

/** The interval method chosen for each estimand, by register id. */
export interface IntervalMethodChoice {
  readonly risk: string;
  readonly riskDifference: string;
  readonly riskRatio: string;
  readonly oddsRatio: string;
}

/**
 * The tests and the ways over strata chosen, by register id. What is left out is the usual one:
 * `chosen-methods.ts` says which.
 */
export interface OtherMethodChoice {
  /** The test of a contrast, by id in FOURFOLD_TESTS. */
  readonly contrastTest?: string | undefined;
  /** The test for a trend, by id in TREND_TESTS. */
  readonly trendTest?: string | undefined;
  /** How a measure is pooled, by id in its `poolings`. */
  readonly poolings?: Readonly<Partial<Record<EffectMeasureId, string>>> | undefined;
  /** Shares of the strata in a chosen standard population, by stratum id; any numbers from 0. */
  readonly standardShares?: Readonly<Record<string, number>> | undefined;
  /** How the strata are compared on a measure, by id in its `homogeneities`. */
  readonly homogeneities?: Readonly<Partial<Record<EffectMeasureId, string>>> | undefined;
}

/** Whether and how the analysis was foreseen. */
export interface AnalysisStanding {
  readonly planned: 'prespecified' | 'postHoc';
  readonly importance: 'primary' | 'secondary';
  readonly analysisSet: string;
}

/**
 * A named contrast over one data cut. Methods belong here, never to the house style. `outcomeId`
 * names an outcome of the study (its words); `columnId` and `eventLevelIds` say how it is counted.
 */
export interface AnalysisSpecification {
  readonly schemaVersion: 1;
  readonly outcome: {
    readonly outcomeId: string;
    readonly columnId: string;
    readonly eventLevelIds: readonly string[];
  };
  readonly exposure: { readonly columnId: string; readonly referenceLevelId: string };
  readonly stratumColumnIds: readonly string[];
  readonly restrictions: readonly Restriction[];
  readonly level: number;
  readonly methods: IntervalMethodChoice;
  readonly otherMethods?: OtherMethodChoice | undefined;
  readonly adjustment: Adjustment;
  /** Scores of the exposure levels by level id; null scores them 1, 2, 3 … in code-book order. */
  readonly trendScores: Readonly<Record<string, number>> | null;
  readonly standing: AnalysisStanding;
}
