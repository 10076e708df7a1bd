import type { EffectMeasure } from './effect-measure';
import type { EffectMeasureId } from './measure-ids';
import { oddsRatio } from './measures/odds-ratio/odds-ratio';
import { riskDifference } from './measures/risk-difference/risk-difference';
import { riskRatio } from './measures/risk-ratio/risk-ratio';

/** The effect measures, in the order in which they are offered. */
export const EFFECT_MEASURES: Readonly<Record<EffectMeasureId, EffectMeasure>> = {
  riskDifference,
  riskRatio,
  oddsRatio,
};

/** Whether a measure has an interval method of this id. */
export function hasInterval(measureId: EffectMeasureId, intervalId: string): boolean {
  return Object.hasOwn(EFFECT_MEASURES[measureId].intervals, intervalId);
}

/** Whether a measure can be pooled over strata in this way. */
export function hasPooling(measureId: EffectMeasureId, poolingId: string): boolean {
  return Object.hasOwn(EFFECT_MEASURES[measureId].poolings, poolingId);
}

/** Whether a measure has a test of homogeneity of this id. */
export function hasHomogeneity(measureId: EffectMeasureId, homogeneityId: string): boolean {
  return Object.hasOwn(EFFECT_MEASURES[measureId].homogeneities, homogeneityId);
}
