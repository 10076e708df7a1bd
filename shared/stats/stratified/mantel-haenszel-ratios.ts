import type { Result } from '#shared/core';
import { cellsOf, issueOfTable, marginsOf } from '../check-counts';
import type { Estimate, EstimationIssue } from '../estimate';
import type { FourfoldTable, StratifiedTable } from '../fourfold-table';
import { issueOfTest } from '../tests-of-association/fourfold-issue';
import type { PooledPoint } from './pooled-estimate';
import { pooledPoint, pooledRatio } from './pooled-estimate';
import { sizeOf, sumOver } from './strata-used';

/**
 * Why a stratum tells nothing about a pooled risk ratio, or null: an empty group, or no events
 * (`emptyMargin`). A stratum in which everybody has the event still tells that the ratio is 1.
 */
export function issueOfRiskRatioStratum(table: FourfoldTable): EstimationIssue | null {
  const { events, others } = marginsOf(table);
  const withoutEvents = events === 0;
  return (
    issueOfTable(table) ??
    (withoutEvents ? { code: 'emptyMargin', facts: { events, others } } : null)
  );
}

/** Why a stratum tells nothing about a pooled odds ratio, or null. */
export function issueOfOddsRatioStratum(table: FourfoldTable): EstimationIssue | null {
  return issueOfTest(table);
}

/**
 * Mantel–Haenszel risk ratio, index over reference, over strata.
 *
 * Takes events and totals by stratum; gives a ratio with limits. Strata with an empty group or
 * without events carry no information; when none other is left: `noInformativeStratum`. No events
 * in one of the groups over all strata: `zeroCell`.
 *
 * Source: Greenland and Robins (1985) Biometrics 41:55-68.
 * Example: 8/106 v 5/120 and 22/98 v 16/85 give 1.33.
 */
export function pooledRiskRatio(
  strata: StratifiedTable,
  level: number,
): Result<Estimate, EstimationIssue> {
  const point = pooledPoint(strata, level, issueOfRiskRatioStratum, riskRatioPoint);
  return point.ok ? pooledRatio(point.value, level, 'greenlandRobins') : point;
}

function riskRatioPoint(used: StratifiedTable): PooledPoint {
  const numerator = sumOver(used, (table) =>
    crossPart(table.index.events, table.reference.total, table),
  );
  const denominator = sumOver(used, (table) =>
    crossPart(table.reference.events, table.index.total, table),
  );
  const spread = sumOver(used, riskRatioSpread);
  return { value: numerator / denominator, variance: spread / numerator / denominator };
}

function riskRatioSpread(table: FourfoldTable): number {
  const { index, reference } = table;
  const size = sizeOf(table);
  const events = index.events + reference.events;
  return (
    (index.total / size) * (reference.total / size) * events -
    (index.events / size) * reference.events
  );
}

/**
 * Mantel–Haenszel odds ratio, index over reference, over strata.
 *
 * Takes events and totals by stratum; gives a ratio with limits. Strata with an empty group, or
 * with events in nobody or in everybody, carry no information; when none other is left:
 * `noInformativeStratum`. An estimate of 0 or infinity: `zeroCell`.
 *
 * Source: Mantel and Haenszel (1959) Journal of the National Cancer Institute 22:719-748; variance
 * of Robins, Breslow and Greenland (1986) Biometrics 42:311-323.
 * Example: the admissions data give 0.9047 (0.7719 to 1.0603).
 */
export function pooledOddsRatio(
  strata: StratifiedTable,
  level: number,
): Result<Estimate, EstimationIssue> {
  const point = pooledPoint(strata, level, issueOfOddsRatioStratum, oddsRatioPoint);
  return point.ok ? pooledRatio(point.value, level, 'robinsBreslowGreenland') : point;
}

function oddsRatioPoint(used: StratifiedTable): PooledPoint {
  const parts = used.map(({ table }) => oddsRatioParts(table));
  const total = (part: (parts: OddsRatioParts) => number): number =>
    parts.reduce((sum, one) => sum + part(one), 0);
  const concordant = total((one) => one.concordant);
  const discordant = total((one) => one.discordant);
  const variance =
    total((one) => one.agreeing * one.concordant) / (2 * concordant ** 2) +
    total((one) => one.agreeing * one.discordant + one.differing * one.concordant) /
      (2 * concordant * discordant) +
    total((one) => one.differing * one.discordant) / (2 * discordant ** 2);
  return { value: concordant / discordant, variance };
}

interface OddsRatioParts {
  /** The products of the two diagonals over the stratum's size. */
  readonly concordant: number;
  readonly discordant: number;
  /** The sums of the two diagonals as shares of the stratum. */
  readonly agreeing: number;
  readonly differing: number;
}

function oddsRatioParts(table: FourfoldTable): OddsRatioParts {
  const cells = cellsOf(table);
  const size = sizeOf(table);
  return {
    concordant: crossPart(cells.indexEvents, cells.referenceOthers, table),
    discordant: crossPart(cells.indexOthers, cells.referenceEvents, table),
    agreeing: (cells.indexEvents + cells.referenceOthers) / size,
    differing: (cells.indexOthers + cells.referenceEvents) / size,
  };
}

function crossPart(left: number, right: number, table: FourfoldTable): number {
  return (left / sizeOf(table)) * right;
}
