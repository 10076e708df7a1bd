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
  readonly adjustment: Adjustment;
  /** Scores of the exposure levels by level id; null scores them 1, 2, 3 … in code-book order. */
  readonly trendScores: Readonly<Record<string, number>> | null;
  readonly standing: AnalysisStanding;
}
