import { failure } from '#shared/core';
import type { Result } from '#shared/core';
import { designGivesRisk } from '#shared/effects/study-design';
import { eValue, fractionInExposed, populationFraction } from '#shared/stats';
import type { Estimate, EstimationIssue, ImpactEstimate } from '#shared/stats';
import type { AnalysisResult } from './analysis-result';
import { contrastTable, layerAt, pooledAt } from './result-places';
import type { ResultScope } from './value-address';

/** A contrast somewhere in a result. */
export interface ImpactPlace {
  readonly scope: ResultScope;
  readonly levelId: string | null;
}

/** What impact measures speak of; every one of them needs a causal reading. */
export interface Impact {
  /** Attributable (or prevented) fraction among the exposed; of the pooled ratio too. */
  readonly fractionInExposed: Result<ImpactEstimate, EstimationIssue>;
  /** Of the two groups as they are, so never of pooled numbers. */
  readonly populationFraction: Result<ImpactEstimate, EstimationIssue>;
  /** E-value of the risk ratio and of its limit nearer to 1 (as `lower`; there is no upper one). */
  readonly eValue: Result<{ readonly value: number; readonly lower: number }, EstimationIssue>;
}

/**
 * The impact of an exposure, from the risk ratio of a contrast and its counts.
 *
 * A design without risks gives `notGivenByDesign`; a ratio that is not estimable gives its issue.
 * Undefined where the result has no such contrast.
 */
export function impactOf(result: AnalysisResult, place: ImpactPlace): Impact | undefined {
  const layer = layerAt(result, place.scope);
  const contrast =
    place.scope.kind === 'pooled'
      ? pooledAt(result, place.levelId)
      : layer?.contrasts.find(({ indexLevelId }) => indexLevelId === place.levelId);
  if (!contrast) {
    return undefined;
  }
  const { riskRatio } = contrast.measures;
  return {
    fractionInExposed: riskRatio.ok ? fractionInExposed(riskRatio.value) : riskRatio,
    populationFraction: populationFractionAt(result, place),
    eValue: eValueOf(riskRatio),
  };
}

function populationFractionAt(
  result: AnalysisResult,
  { scope, levelId }: ImpactPlace,
): Impact['populationFraction'] {
  const { frame, specification } = result;
  const table = contrastTable(layerAt(result, scope), levelId);
  const sampled = designGivesRisk(frame.design) ? 'population' : 'casesAndControls';
  return table
    ? populationFraction(table, specification.level, sampled)
    : failure({ code: 'notGivenByDesign' });
}

function eValueOf(riskRatio: Result<Estimate, EstimationIssue>): Impact['eValue'] {
  if (!riskRatio.ok) {
    return riskRatio;
  }
  const { value, interval } = riskRatio.value;
  const found = eValue({ value, lower: interval.lower, upper: interval.upper });
  return found.ok
    ? { ok: true, value: { value: found.value.ofValue, lower: found.value.ofLimit } }
    : found;
}
