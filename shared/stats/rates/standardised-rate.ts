import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { issueOfLevel } from '../check-counts';
import { gammaQuantile, gammaUpperQuantile } from '../distributions';
import type { Estimate, EstimationIssue } from '../estimate';
import type { MethodWords } from '../intervals';
import type { Limits } from '../intervals/interval-method';
import { issueOfRate, rateOf } from './rate-count';
import type { RateCount } from './rate-count';

/** A stratum's events and person-time, and its size in the standard population. */
export interface StandardisedStratum {
  readonly id: string;
  readonly count: RateCount;
  /** At least 0, of any unit: weights are made to sum to 1. */
  readonly weight: number;
}

/** Names and source of the limits of a directly standardised rate. */
export const RATE_STANDARDISATION = {
  fayFeuer: {
    id: 'fayFeuer',
    label: 'Fay–Feuer gamma',
    shortLabel: 'gamma',
    citation:
      'Fay MP, Feuer EJ. Confidence intervals for directly standardized rates: a method based on ' +
      'the gamma distribution. Statistics in Medicine 1997;16:791-801.',
  },
} as const satisfies Readonly<Record<string, MethodWords>>;

/**
 * Directly standardised rate with Fay and Feuer's gamma limits.
 *
 * Takes events, person-time and standard weight by stratum; gives events per unit of that time.
 * A weighted stratum without person-time gives `emptyGroup` with its id (the standard would not be
 * kept), weights that sum to nothing `noInformativeStratum`. Without events: 0 and an upper limit.
 *
 * Source: Fay and Feuer (1997) Statistics in Medicine 16:791-801.
 */
export function standardisedRate(
  strata: readonly StandardisedStratum[],
  level: number,
): Result<Estimate, EstimationIssue> {
  const issue = issueOfLevel(level) ?? issueOfStrata(strata);
  if (issue) {
    return failure(issue);
  }
  const total = strata.reduce((sum, { weight }) => sum + weight, 0);
  const used = strata
    .filter(({ weight }) => weight > 0)
    .map(({ count, weight }) => ({ count, weight: weight / total }));
  const value = used.reduce((sum, { count, weight }) => sum + weight * rateOf(count), 0);
  const [lower, upper] = gammaLimits(used, value, (1 - level) / 2);
  return success({ value, interval: { lower, upper, level, method: 'fayFeuer' } });
}

function issueOfStrata(strata: readonly StandardisedStratum[]): EstimationIssue | null {
  const unusable = strata.find(({ weight }) => !Number.isFinite(weight) || weight < 0);
  if (unusable) {
    return { code: 'invalidCounts', facts: { stratum: unusable.id } };
  }
  const weighted = strata.filter(({ weight }) => weight > 0);
  for (const { id, count } of weighted) {
    const issue = issueOfRate(count, 'group');
    if (issue) {
      return { code: issue.code, facts: { ...issue.facts, stratum: id } };
    }
  }
  return weighted.length === 0
    ? { code: 'noInformativeStratum', facts: { strata: strata.length } }
    : null;
}

type Weighted = Pick<StandardisedStratum, 'count' | 'weight'>;

function gammaLimits(strata: readonly Weighted[], value: number, tail: number): Limits {
  const variance = strata.reduce(
    (sum, { count, weight }) => sum + (weight / count.time) ** 2 * count.events,
    0,
  );
  const largest = Math.max(...strata.map(({ count, weight }) => weight / count.time));
  return [
    value === 0 ? 0 : gammaQuantile(tail, value ** 2 / variance) * (variance / value),
    upperLimit(value + largest, variance + largest ** 2, tail),
  ];
}

function upperLimit(mean: number, variance: number, tail: number): number {
  return gammaUpperQuantile(tail, mean ** 2 / variance) * (variance / mean);
}
