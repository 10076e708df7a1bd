import type { Result } from '#shared/core';
import { issueOfTable } from '../check-counts';
import type { Estimate, EstimationIssue } from '../estimate';
import { productDifference } from '../exact';
import type { FourfoldTable, StratifiedTable } from '../fourfold-table';
import { varianceOfDifference } from '../variances';
import { pooledDifference, pooledPoint } from './pooled-estimate';
import { sizeOf, sumOver } from './strata-used';

/** Variances of a pooled risk difference: Sato's holds for sparse and for large strata. */
export type PooledDifferenceVariance = 'sato' | 'greenlandRobins';

/**
 * Mantel–Haenszel risk difference, index minus reference, over strata.
 *
 * Takes events and totals by stratum; gives a proportion in [-1, 1] with limits. Strata with an
 * empty group carry no information; when none other is left: `noInformativeStratum`.
 *
 * Source: Greenland and Robins (1985) Biometrics 41:55-68; variance of Sato (1989) Biometrics
 * 45:1323-1324 unless theirs is asked for.
 * Example: 8/106 v 5/120 and 22/98 v 16/85 give 0.0349.
 */
export function pooledRiskDifference(
  strata: StratifiedTable,
  level: number,
  variance: PooledDifferenceVariance = 'sato',
): Result<Estimate, EstimationIssue> {
  const point = pooledPoint(strata, level, issueOfTable, (used) => {
    const value = sumOver(used, differencePart) / sumOver(used, weight);
    return { value, variance: VARIANCES[variance](used, value) };
  });
  return point.ok ? pooledDifference(point.value, level, variance) : point;
}

function weight(table: FourfoldTable): number {
  return (table.index.total / sizeOf(table)) * table.reference.total;
}

function differencePart(table: FourfoldTable): number {
  const { index, reference } = table;
  return (
    productDifference(index.events, reference.total, reference.events, index.total) / sizeOf(table)
  );
}

const VARIANCES: Readonly<
  Record<PooledDifferenceVariance, (strata: StratifiedTable, value: number) => number>
> = {
  sato: (strata, value) =>
    (value * sumOver(strata, satoSizePart) + sumOver(strata, satoEventPart)) /
    sumOver(strata, weight) ** 2,
  greenlandRobins: (strata) => sumOver(strata, greenlandRobinsPart) / sumOver(strata, weight) ** 2,
};

function satoSizePart(table: FourfoldTable): number {
  const { index, reference } = table;
  const size = sizeOf(table);
  const indexShare = index.total / size;
  const referenceShare = reference.total / size;
  return (
    indexShare * indexShare * reference.events -
    referenceShare * referenceShare * index.events +
    (indexShare * referenceShare * (reference.total - index.total)) / 2
  );
}

function satoEventPart(table: FourfoldTable): number {
  const { index, reference } = table;
  const size = sizeOf(table);
  return (
    ((index.events / size) * (reference.total - reference.events)) / 2 +
    ((reference.events / size) * (index.total - index.events)) / 2
  );
}

function greenlandRobinsPart(table: FourfoldTable): number {
  const squaredWeight = weight(table) ** 2;
  return squaredWeight * varianceOfDifference(table);
}
