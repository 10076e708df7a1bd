import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import type { Tally } from '#shared/tally';
import type { AnalysisIssue } from './analysis-issue';
import type {
  AnalysisResult,
  LayerResult,
  PooledContrastResult,
  ResultFrame,
} from './analysis-result';
import { computeLayer } from './compute-layer';
import { computePooled } from './compute-pooled';
import { ENGINE_VERSION } from './engine-version';
import type { AnalysisSpecification } from './specification';
import { issueOfSpecification } from './specification-issue';
import { countsOf } from './tables';

/**
 * Computes an analysis from its counts.
 *
 * Takes the specification, the frame that `frameOf` made for it, and the tally that
 * `tallyRequestOf` asked for. Gives every number of the analysis, plain and JSON-safe; a number
 * that is not defined is an issue in its place, never NaN. With adjustment "mantelHaenszel" the
 * contrasts are also pooled over strata. Fails as a whole only when specification, frame and tally
 * do not fit each other, or for an unknown method or level.
 */
export function computeAnalysis(
  specification: AnalysisSpecification,
  frame: ResultFrame,
  tally: Tally,
  engineVersion: string = ENGINE_VERSION,
): Result<AnalysisResult, AnalysisIssue> {
  const issue = issueOfSpecification(specification, frame);
  if (issue) {
    return failure(issue);
  }
  const counts = countsOf(specification, frame, tally);
  if (!counts.ok) {
    return counts;
  }
  const strata = [...counts.value.strata].map(([id, layer]) =>
    computeLayer(specification, frame, id, layer),
  );
  return success({
    schemaVersion: 1,
    engineVersion,
    specification,
    frame,
    counted: tally.counted,
    restricted: tally.restricted,
    leftOut: tally.leftOut,
    crude: computeLayer(specification, frame, null, counts.value.crude),
    strata,
    pooled: pooledOf(specification, frame, strata),
  });
}

function pooledOf(
  specification: AnalysisSpecification,
  frame: ResultFrame,
  strata: readonly LayerResult[],
): readonly PooledContrastResult[] {
  if (specification.adjustment !== 'mantelHaenszel' || strata.length === 0) {
    return [];
  }
  const { levels, referenceLevelId } = frame.exposure;
  return levels
    .filter(({ id }) => id !== referenceLevelId)
    .map(({ id }) => computePooled(specification, frame, strata, id));
}
