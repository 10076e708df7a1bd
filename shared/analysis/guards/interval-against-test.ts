import { EFFECT_MEASURES, EFFECT_MEASURE_IDS } from '#shared/effects';
import type { EffectMeasureId } from '#shared/effects';
import type { Result } from '#shared/core';
import type { Estimate, EstimationIssue, TestOutcome } from '#shared/stats';
import type { AnalysisResult } from '../analysis-result';
import { printedTest } from '../printed-test';
import type { ResultScope } from '../value-address';
import type { Guard, GuardPoint } from './guard';
import { layersOf, scopeOf } from './places';

/**
 * An interval holds no difference while the test that is printed beside it rejects it, or the other
 * way round: they come from different methods. Facts: measureIds (whose intervals disagree), method
 * (of the test), pValue, largest (the p-value at which the level of the intervals rejects).
 */
export const intervalAgainstTest = {
  id: 'intervalAgainstTest',
  severity: 'note',
  source:
    'Fagerland MW, Lydersen S, Laake P. Statistical Analysis of Contingency Tables. ' +
    'CRC Press 2017, chapter 4: choose an interval and a test that agree.',
  find: (result) => comparedIn(result).flatMap((compared) => pointsOf(result, compared)),
} as const satisfies Guard<'intervalAgainstTest'>;

/** A contrast somewhere, with the test that speaks of it. */
interface Compared {
  readonly scope: ResultScope;
  readonly levelId: string;
  readonly measures: Readonly<Record<EffectMeasureId, Result<Estimate, EstimationIssue>>>;
  readonly test: Result<TestOutcome, EstimationIssue>;
}

function comparedIn(result: AnalysisResult): readonly Compared[] {
  const within = layersOf(result).flatMap((layer) =>
    layer.contrasts.map((contrast) => ({
      scope: scopeOf(layer),
      levelId: contrast.indexLevelId,
      measures: contrast.measures,
      test: printedTest(result, layer, contrast).outcome,
    })),
  );
  const pooled = result.pooled.map(({ indexLevelId, measures, conditionalIndependence }) => ({
    scope: { kind: 'pooled' } as const,
    levelId: indexLevelId,
    measures,
    test: conditionalIndependence,
  }));
  return [...within, ...pooled];
}

function pointsOf(
  { specification }: AnalysisResult,
  { scope, levelId, measures, test }: Compared,
): readonly GuardPoint[] {
  if (!test.ok) {
    return [];
  }
  const largest = 1 - specification.level;
  const { method, pValue } = test.value;
  const measureIds = EFFECT_MEASURE_IDS.filter((id) => {
    const estimate = measures[id];
    return estimate.ok && excludesNull(id, estimate.value) !== pValue < largest;
  });
  return measureIds.length > 0
    ? [{ place: { scope, levelId }, facts: { measureIds, method, pValue, largest } }]
    : [];
}

function excludesNull(id: EffectMeasureId, { interval }: Estimate): boolean {
  const { nullValue } = EFFECT_MEASURES[id];
  return interval.lower > nullValue || interval.upper < nullValue;
}
