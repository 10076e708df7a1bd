import { failure } from '#shared/core';
import type { Result } from '#shared/core';
import { EFFECT_MEASURES } from '#shared/effects';
import type { EffectMeasureId } from '#shared/effects';
import type { Estimate, EstimationIssue, StratifiedTable } from '#shared/stats';
import type { ResultFrame } from './analysis-result';

/** Under what strata are pooled. */
export interface PoolingSetting {
  readonly level: number;
  /** Knows the strata by their labels. */
  readonly frame: Pick<ResultFrame, 'strata'>;
}

/** A measure pooled in one way; an issue that names a stratum gives its label, for the words. */
export function poolOver(
  strata: StratifiedTable,
  measureId: EffectMeasureId,
  poolingId: string,
  { level, frame }: PoolingSetting,
): Result<Estimate, EstimationIssue> {
  const estimate = EFFECT_MEASURES[measureId].pooled(strata, level, poolingId);
  const stratum = estimate.ok
    ? undefined
    : frame.strata.find(({ id }) => id === estimate.issue.facts?.stratum);
  if (estimate.ok || stratum === undefined) {
    return estimate;
  }
  const facts = { ...estimate.issue.facts, stratum: stratum.label };
  return failure({ ...estimate.issue, facts });
}
