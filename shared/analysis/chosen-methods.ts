import { EFFECT_MEASURES, EFFECT_MEASURE_IDS } from '#shared/effects';
import type { EffectMeasureId } from '#shared/effects';
import { FOURFOLD_TESTS, TREND_TESTS } from '#shared/stats';
import type { FourfoldTest, TrendTest } from '#shared/stats';
import type { AnalysisSpecification } from './specification';

/** Id of the test of a contrast; null leaves it to the expected counts (`printedTest`). */
export function contrastTestId({ otherMethods }: AnalysisSpecification): string | null {
  return otherMethods?.contrastTest ?? null;
}

/** Id of the test for a trend; Cochran and Armitage's unless another was chosen. */
export function trendTestId({ otherMethods }: AnalysisSpecification): string {
  return otherMethods?.trendTest ?? 'cochranArmitage';
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
export function takesTime(specification: AnalysisSpecification): boolean {
  const { methods } = specification;
  const intervals = EFFECT_MEASURE_IDS.map((id) => EFFECT_MEASURES[id].intervals[methods[id]]);
  const test = registered<FourfoldTest>(FOURFOLD_TESTS, contrastTestId(specification) ?? '');
  const trend = registered<TrendTest>(TREND_TESTS, trendTestId(specification));
  return [...intervals, test, trend].some((method) => method?.effort === 'heavy');
}

/** A member of a register; undefined where it has none of that id. */
export function registered<Method>(
  register: Readonly<Record<string, Method>>,
  id: string,
): Method | undefined {
  return Object.hasOwn(register, id) ? register[id] : undefined;
}
