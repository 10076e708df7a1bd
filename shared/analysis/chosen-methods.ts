import { EFFECT_MEASURES, EFFECT_MEASURE_IDS } from '#shared/effects';
import type { EffectMeasureId } from '#shared/effects';
import type { AnalysisSpecification } from './specification';

/** Id of the test of a contrast; Pearson's chi-square unless another was chosen. */
export function contrastTestId({ otherMethods }: AnalysisSpecification): string {
  return otherMethods?.contrastTest ?? 'pearsonChiSquare';
}

/** Id of the way in which a measure is pooled over strata. */
export function poolingId(
  { otherMethods }: AnalysisSpecification,
  measureId: EffectMeasureId,
): string {
  return otherMethods?.poolings?.[measureId] ?? EFFECT_MEASURES[measureId].defaultPoolingId;
}

/** Id of the test of whether a measure is the same in all strata. */
export function homogeneityId(
  { otherMethods }: AnalysisSpecification,
  measureId: EffectMeasureId,
): string {
  return (
    otherMethods?.homogeneities?.[measureId] ?? EFFECT_MEASURES[measureId].defaultHomogeneityId
  );
}

/** Whether some chosen method is heavy, so that the analysis is no work for a main thread. */
export function takesTime({ methods }: AnalysisSpecification): boolean {
  return EFFECT_MEASURE_IDS.some(
    (id) => EFFECT_MEASURES[id].intervals[methods[id]]?.effort === 'heavy',
  );
}
