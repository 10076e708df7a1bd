import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { issueOfLevel } from '../check-counts';
import { criticalValue } from '../distributions';
import type { Estimate, EstimationIssue } from '../estimate';
import type { FourfoldTable, StratifiedTable } from '../fourfold-table';
import { clampLimits } from '../intervals/clamp';
import { invalidStratum, partStrata } from './strata-used';

/** A pooled point with the variance that its interval rests on. */
export interface PooledPoint {
  readonly value: number;
  /** Of the value itself for a difference, of its logarithm for a ratio. */
  readonly variance: number;
}

/**
 * Pools the strata that carry information: `point` sees those only. No such stratum gives
 * `noInformativeStratum`.
 */
export function pooledPoint(
  strata: StratifiedTable,
  level: number,
  issueOf: (table: FourfoldTable) => EstimationIssue | null,
  point: (used: StratifiedTable) => PooledPoint,
): Result<PooledPoint, EstimationIssue> {
  const informative = informativeStrata(strata, level, issueOf);
  return informative.ok ? success(point(informative.value)) : informative;
}

/** The strata without an issue; or that of the level, of invalid counts, or of having none. */
export function informativeStrata(
  strata: StratifiedTable,
  level: number,
  issueOf: (table: FourfoldTable) => EstimationIssue | null,
): Result<StratifiedTable, EstimationIssue> {
  const parted = partStrata(strata, issueOf);
  const issue = issueOfLevel(level) ?? invalidStratum(parted);
  if (issue) {
    return failure(issue);
  }
  return parted.used.length === 0
    ? failure({ code: 'noInformativeStratum', facts: { strata: strata.length } })
    : success(parted.used);
}

/** A pooled difference with limits symmetric around it, cut to [-1, 1]. */
export function pooledDifference(
  { value, variance }: PooledPoint,
  level: number,
  method: string,
): Result<Estimate, EstimationIssue> {
  const spread = criticalValue(level) * Math.sqrt(Math.max(0, variance));
  const [lower, upper] = clampLimits([value - spread, value + spread], -1, 1);
  return success({ value, interval: { lower, upper, level, method } });
}

/**
 * A pooled ratio with limits symmetric on the log scale. A ratio of 0 or infinity has no such
 * limits: `zeroCell`.
 */
export function pooledRatio(
  { value, variance }: PooledPoint,
  level: number,
  method: string,
): Result<Estimate, EstimationIssue> {
  const factor = Math.exp(criticalValue(level) * Math.sqrt(Math.max(0, variance)));
  const [lower, upper] = [value / factor, value * factor];
  const estimable = value > 0 && lower > 0 && Number.isFinite(upper);
  return estimable
    ? success({ value, interval: { lower, upper, level, method } })
    : failure({ code: 'zeroCell' });
}
