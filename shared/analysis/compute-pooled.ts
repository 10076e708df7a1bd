import { failure } from '#shared/core';
import type { Result } from '#shared/core';
import { EFFECT_MEASURES, EFFECT_MEASURE_IDS } from '#shared/effects';
import type { EffectMeasureId } from '#shared/effects';
import { cochranMantelHaenszel } from '#shared/stats';
import type { Estimate, EstimationIssue, HomogeneityTest, StratifiedTable } from '#shared/stats';
import { homogeneityId, poolingId } from './chosen-methods';
import type { PooledContrastResult, ResultFrame, StratumLeftOut } from './analysis-result';
import { computeInteraction } from './compute-interaction';
import { byMeasure, ifGiven, tableOf } from './compute-layer';
import type { AnalysisSpecification } from './specification';
import type { AnalysisCounts } from './tables';

/** One level against the reference, pooled over strata, with what was left out of which number. */
export function computePooled(
  specification: AnalysisSpecification,
  frame: ResultFrame,
  counts: AnalysisCounts,
  indexLevelId: string,
): PooledContrastResult {
  const { level } = specification;
  const { referenceLevelId } = frame.exposure;
  const strata = strataOf(specification, counts, indexLevelId, referenceLevelId);
  const homogeneity = byMeasure((id) => homogeneityOf(id, specification, frame, strata));
  const measureLeftOut = byMeasure((id) => leftOutOf(id, specification, frame, strata));
  return {
    indexLevelId,
    referenceLevelId,
    measures: byMeasure((id) =>
      ifGiven(id, frame, () =>
        withLabel(EFFECT_MEASURES[id].pooled(strata, level, poolingId(specification, id)), frame),
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

/** The contrast's tables, with what standardisation needs to know of each stratum. */
function strataOf(
  { otherMethods }: AnalysisSpecification,
  counts: AnalysisCounts,
  indexLevelId: string,
  referenceLevelId: string,
): StratifiedTable {
  return [...counts.strata].map(([id, layer]) => {
    const share = otherMethods?.standardShares?.[id];
    return {
      id,
      table: tableOf(layer, indexLevelId, referenceLevelId),
      members: [...layer.values()].reduce((sum, { total }) => sum + total, 0),
      ...(share === undefined ? {} : { share }),
    };
  });
}

/** An issue that names a stratum gets the stratum's label in place of its id. */
function withLabel(
  estimate: Result<Estimate, EstimationIssue>,
  { strata }: ResultFrame,
): Result<Estimate, EstimationIssue> {
  const stratum = estimate.ok
    ? undefined
    : strata.find(({ id }) => id === estimate.issue.facts?.stratum);
  if (estimate.ok || stratum === undefined) {
    return estimate;
  }
  const facts = { ...estimate.issue.facts, stratum: stratum.label };
  return failure({ ...estimate.issue, facts });
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
