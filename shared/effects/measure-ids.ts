/** Ids of the effect measures, in the order in which they are offered. */
export const EFFECT_MEASURE_IDS = ['riskDifference', 'riskRatio', 'oddsRatio'] as const;

/** Id of an effect measure. */
export type EffectMeasureId = (typeof EFFECT_MEASURE_IDS)[number];
