import { failure } from '#shared/core';
import { EFFECT_MEASURES, EFFECT_MEASURE_IDS } from '#shared/effects';
import type { EffectMeasureId } from '#shared/effects';
import { cochranMantelHaenszel } from '#shared/stats';
import type { HomogeneityTest, StratifiedTable } from '#shared/stats';
import { homogeneityId, poolingId } from './chosen-methods';
import type {
  LayerResult,
  PooledContrastResult,
  ResultFrame,
  StratumLeftOut,
} from './analysis-result';
import { computeInteraction } from './compute-interaction';
import { byMeasure, ifGiven } from './compute-layer';
import { poolOver } from './pool-over';
import { contrastStrata } from './result-places';
import type { AnalysisSpecification } from './specification';

/** One level against the reference, pooled over strata, with what was left out of which number. */
export function computePooled(
  specification: AnalysisSpecification,
  frame: ResultFrame,
  layers: readonly LayerResult[],
  indexLevelId: string,
): PooledContrastResult {
  const { level } = specification;
  const { referenceLevelId } = frame.exposure;
  const strata = contrastStrata({ specification, strata: layers }, indexLevelId);
  const homogeneity = byMeasure((id) => homogeneityOf(id, specification, frame, strata));
  const measureLeftOut = byMeasure((id) => leftOutOf(id, specification, frame, strata));
  return {
    indexLevelId,
    referenceLevelId,
    measures: byMeasure((id) =>
      ifGiven(id, frame, () =>
        poolOver(strata, id, poolingId(specification, id), { level, frame }),
      ),
    ),
    homogeneity: byMeasure((id) => homogeneity[id].outcome),
    conditionalIndependence: cochranMantelHaenszel(strata),
    ...computeInteraction(strata, frame, level),
    leftOut: leftOutOfAll(measureLeftOut, frame),
    measureLeftOut,
    homogeneityLeftOut: byMeasure((id) => homogeneity[id].leftOut),
  };
}

function homogeneityOf(
  id: EffectMeasureId,
  specification: AnalysisSpecification,
  frame: ResultFrame,
  strata: StratifiedTable,
): HomogeneityTest {
  const measure = EFFECT_MEASURES[id];
  return measure.givenBy(frame.design)
    ? measure.homogeneity(strata, homogeneityId(specification, id))
    : { outcome: failure({ code: 'notGivenByDesign' }), leftOut: [] };
}

function leftOutOf(
  id: EffectMeasureId,
  specification: AnalysisSpecification,
  frame: ResultFrame,
  strata: StratifiedTable,
): readonly StratumLeftOut[] {
  const measure = EFFECT_MEASURES[id];
  return measure.givenBy(frame.design)
    ? measure.uninformative(strata, poolingId(specification, id))
    : [];
}

/** Strata that none of the measures which the design gives could use. */
function leftOutOfAll(
  byId: Readonly<Record<EffectMeasureId, readonly StratumLeftOut[]>>,
  frame: ResultFrame,
): readonly StratumLeftOut[] {
  const given = EFFECT_MEASURE_IDS.filter((id) => EFFECT_MEASURES[id].givenBy(frame.design));
  const [first, ...others] = given.map((id) => byId[id]);
  const everywhere = ({ stratumId }: StratumLeftOut): boolean =>
    others.every((list) => list.some((other) => other.stratumId === stratumId));
  return (first ?? []).filter(everywhere);
}
