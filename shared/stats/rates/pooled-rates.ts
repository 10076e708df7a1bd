import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { issueOfLevel } from '../check-counts';
import { criticalValue } from '../distributions';
import type { Estimate, EstimationIssue } from '../estimate';
import { pooledRatio } from '../stratified/pooled-estimate';
import type { PooledPoint } from '../stratified/pooled-estimate';
import { issueOfNoEvents, issueOfRates, rateDifferenceOf } from './rate-count';
import type { RateStratum, RateTable } from './rate-count';

/** Why a stratum tells nothing about a pooled rate ratio, or null. */
export function issueOfRateRatioStratum(table: RateTable): EstimationIssue | null {
  return issueOfRates(table) ?? issueOfNoEvents(table);
}

/**
 * Mantel–Haenszel rate ratio, index over reference, over strata.
 *
 * Takes events and person-time by stratum; gives a ratio with limits. Strata without person-time
 * in a group or without events carry no information; when none other is left:
 * `noInformativeStratum`. No events in one of the groups over all strata: `zeroCell`.
 *
 * Source: Greenland and Robins (1985) Biometrics 41:55-68.
 */
export function pooledRateRatio(
  strata: readonly RateStratum[],
  level: number,
): Result<Estimate, EstimationIssue> {
  const used = usedStrata(strata, level, issueOfRateRatioStratum);
  return used.ok ? pooledRatio(ratioPoint(used.value), level, 'greenlandRobins') : used;
}

/**
 * Mantel–Haenszel rate difference, index less reference, over strata.
 *
 * Takes events and person-time by stratum; gives events per unit of that time with limits. Strata
 * without person-time in a group carry no information; when none other is left:
 * `noInformativeStratum`. No events at all would give a width of 0: `noEvents`.
 *
 * Source: Greenland and Robins (1985) Biometrics 41:55-68.
 */
export function pooledRateDifference(
  strata: readonly RateStratum[],
  level: number,
): Result<Estimate, EstimationIssue> {
  const used = usedStrata(strata, level, issueOfRates);
  if (!used.ok) {
    return used;
  }
  const { value, variance } = differencePoint(used.value);
  const spread = criticalValue(level) * Math.sqrt(variance);
  const interval = { lower: value - spread, upper: value + spread, level };
  return variance === 0
    ? failure({ code: 'noEvents', facts: { events: 0 } })
    : success({ value, interval: { ...interval, method: 'greenlandRobins' } });
}

function usedStrata(
  strata: readonly RateStratum[],
  level: number,
  issueOf: (table: RateTable) => EstimationIssue | null,
): Result<readonly RateTable[], EstimationIssue> {
  const tables = strata.map(({ table }) => table);
  const invalid = tables.map(issueOfRates).find((issue) => issue?.code === 'invalidCounts');
  const issue = issueOfLevel(level) ?? invalid;
  if (issue) {
    return failure(issue);
  }
  const used = tables.filter((table) => issueOf(table) === null);
  return used.length === 0
    ? failure({ code: 'noInformativeStratum', facts: { strata: strata.length } })
    : success(used);
}

function ratioPoint(used: readonly RateTable[]): PooledPoint {
  const numerator = sumOver(used, (table) => table.index.events * referenceShare(table));
  const denominator = sumOver(used, (table) => table.reference.events * indexShare(table));
  const spread = sumOver(used, (table) => {
    const events = table.index.events + table.reference.events;
    return events * indexShare(table) * referenceShare(table);
  });
  return { value: numerator / denominator, variance: spread / numerator / denominator };
}

function differencePoint(used: readonly RateTable[]): PooledPoint {
  const weights = sumOver(used, weightOf);
  const value = sumOver(used, (table) => (weightOf(table) / weights) * rateDifferenceOf(table));
  const variance = sumOver(used, (table) => {
    const { index, reference } = table;
    const part = index.events / index.time ** 2 + reference.events / reference.time ** 2;
    return (weightOf(table) / weights) ** 2 * part;
  });
  return { value, variance };
}

function indexShare({ index, reference }: RateTable): number {
  return index.time / (index.time + reference.time);
}

function referenceShare({ index, reference }: RateTable): number {
  return reference.time / (index.time + reference.time);
}

function weightOf(table: RateTable): number {
  return table.index.time * referenceShare(table);
}

function sumOver(tables: readonly RateTable[], part: (table: RateTable) => number): number {
  return tables.reduce((sum, table) => sum + part(table), 0);
}
