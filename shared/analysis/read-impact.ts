import { failure } from '#shared/core';
import type { Result } from '#shared/core';
import { designGivesRisk } from '#shared/effects/study-design';
import { eValue, fractionInExposed, populationFraction } from '#shared/stats';
import type { EValue, Estimate, EstimationIssue, ImpactEstimate } from '#shared/stats';
import type { AnalysisResult } from './analysis-result';
import { contrastTable, layerAt } from './result-places';
import type { ResultScope } from './value-address';

/** A contrast somewhere in a result. */
export interface ImpactPlace {
  readonly scope: ResultScope;
  readonly levelId: string | null;
}

/**
 * Attributable (or prevented) fraction among the exposed, of a contrast's risk ratio, crude or
 * pooled; it needs a causal reading. Undefined where the result has no such contrast.
 */
export function fractionInExposedAt(
  result: AnalysisResult,
  place: ImpactPlace,
): Result<ImpactEstimate, EstimationIssue> | undefined {
  const ratio = riskRatioAt(result, place);
  return ratio?.ok ? fractionInExposed(ratio.value) : ratio;
}

/**
 * Attributable (or prevented) fraction in the population of the two groups as they are: of pooled
 * numbers, and where the design gives no risk, `notGivenByDesign`. It needs a causal reading.
 * Undefined where the result has no such contrast.
 */
export function populationFractionAt(
  result: AnalysisResult,
  place: ImpactPlace,
): Result<ImpactEstimate, EstimationIssue> | undefined {
  if (riskRatioAt(result, place) === undefined) {
    return undefined;
  }
  const { frame, specification } = result;
  const table = contrastTable(layerAt(result, place.scope), place.levelId);
  const sampled = designGivesRisk(frame.design) ? 'population' : 'casesAndControls';
  return table
    ? populationFraction(table, specification.level, sampled)
    : failure({ code: 'notGivenByDesign' });
}

/**
 * E-value of a contrast's risk ratio and of its limit nearer to 1; it needs a causal reading.
 * Undefined where the result has no such contrast.
 */
export function eValueAt(
  result: AnalysisResult,
  place: ImpactPlace,
): Result<EValue, EstimationIssue> | undefined {
  const ratio = riskRatioAt(result, place);
  if (!ratio?.ok) {
    return ratio;
  }
  const { value, interval } = ratio.value;
  return eValue({ value, lower: interval.lower, upper: interval.upper });
}

function riskRatioAt(
  result: AnalysisResult,
  { scope, levelId }: ImpactPlace,
): Result<Estimate, EstimationIssue> | undefined {
  const contrasts = scope.kind === 'pooled' ? result.pooled : layerAt(result, scope)?.contrasts;
  return contrasts?.find(({ indexLevelId }) => indexLevelId === levelId)?.measures.riskRatio;
}
