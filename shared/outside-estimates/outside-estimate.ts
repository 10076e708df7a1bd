/** Measures that an estimate from elsewhere may be of; a hazard ratio is printed as such. */
export const OUTSIDE_MEASURES = [
  'riskDifference',
  'riskRatio',
  'oddsRatio',
  'rateRatio',
  'hazardRatio',
] as const;

/** One of the measures. */
export type OutsideMeasureId = (typeof OUTSIDE_MEASURES)[number];

/**
 * An adjusted estimate that a model outside computed, as it was entered. Numbers stay texts
 * ("1.50"), so that their digits are known; differences are in percentage points. `levelId` is the
 * exposure level that is compared with `referenceLevelId`, or null for one estimate about all
 * levels (per step, or a trend).
 */
export interface OutsideEstimateEntry {
  readonly levelId: string | null;
  readonly referenceLevelId: string;
  readonly measure: OutsideMeasureId;
  readonly value: string;
  readonly lower: string;
  readonly upper: string;
  /** Confidence level of the limits, 0.95. */
  readonly level: number;
  /** "0.03" or "<0.001"; null where none is given. */
  readonly pValue: string | null;
  /** The model in words: "logistic regression". */
  readonly method: string;
  /** What it is adjusted for, as sentences name it: "age", "sex". */
  readonly covariates: readonly string[];
  readonly numberAnalysed: number | null;
  /** Who or what computed it: "Statistics group, script of the main model". */
  readonly source: string;
  /** The day of the computation, as in 2026-05-12; null where it is not known. */
  readonly computedOn: string | null;
  readonly note: string | null;
}

/** An estimate from elsewhere as it stands beside an analysis; `version` counts its changes. */
export interface OutsideEstimate extends OutsideEstimateEntry {
  readonly id: string;
  readonly studyId: string;
  readonly analysisId: string;
  readonly version: number;
}

/** The value at which groups do not differ: 0 for a difference, 1 for a ratio. */
export function outsideNullValue(measure: OutsideMeasureId): 0 | 1 {
  return measure === 'riskDifference' ? 0 : 1;
}

/** Whether estimates belong to one model: they share method, covariates, number and source. */
export function isSameModel(one: OutsideEstimateEntry, other: OutsideEstimateEntry): boolean {
  return modelKey(one) === modelKey(other);
}

function modelKey(entry: OutsideEstimateEntry): string {
  const { method, covariates, numberAnalysed, source, computedOn, level } = entry;
  return JSON.stringify([method, covariates, numberAnalysed, source, computedOn, level]);
}
