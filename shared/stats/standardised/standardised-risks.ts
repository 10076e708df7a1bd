import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { issueOfLevel, issueOfTable } from '../check-counts';
import { criticalValue } from '../distributions';
import type { Estimate, EstimationIssue } from '../estimate';
import type { GroupCount, StratifiedTable } from '../fourfold-table';
import { clampLimits } from '../intervals/clamp';
import type { MethodWords } from '../intervals/interval-method';
import { varianceOfRisk } from '../variances';
import type { StandardPopulation, WeightedStratum } from './standard-population';
import { weightedStrata } from './standard-population';

/** Risks of two groups, standardised to one population, and how they differ. */
export interface StandardisedRisks {
  /** The share of each stratum in the standard population, by its id; those above 0 sum to 1. */
  readonly shares: Readonly<Record<string, number>>;
  readonly index: Result<Estimate, EstimationIssue>;
  readonly reference: Result<Estimate, EstimationIssue>;
  readonly difference: Result<Estimate, EstimationIssue>;
  readonly ratio: Result<Estimate, EstimationIssue>;
}

/** How the limits are named. */
export const STANDARDISATION = {
  id: 'directStandardisation',
  label: 'Direct standardisation with delta-method limits',
  shortLabel: 'direct standardisation',
  citation:
    'Fleiss JL, Levin B, Paik MC. Statistical methods for rates and proportions. 3rd edition. ' +
    'Hoboken: Wiley; 2003. Chapter 19.',
} as const satisfies MethodWords;

/**
 * Direct standardisation: what each group's risk would be if its strata had the shares of a
 * standard population, with the difference and ratio of the two.
 *
 * Takes events and totals by stratum; gives proportions and a ratio, with limits by the delta
 * method (of the logarithm for the ratio), the strata being independent. A group without members
 * in a stratum that has a share gives `emptyGroupInStratum` with the `stratum`'s id (its label is
 * the caller's to put in): nothing is weighed anew. Shares that do not fit: `invalidWeights`. A
 * number without variance (all risks 0 or 1), or a ratio with 0: `zeroCell`.
 *
 * Source: Fleiss, Levin and Paik (2003) Statistical Methods for Rates and Proportions, chapter 19.
 * Example: 8/106 v 5/120 and 22/98 v 16/85 standardised to the total give 0.1421 v 0.1072.
 */
export function standardisedRisks(
  strata: StratifiedTable,
  population: StandardPopulation,
  level: number,
): Result<StandardisedRisks, EstimationIssue> {
  const weighted = weightedStrata(strata, population);
  const issue = issueOfLevel(level) ?? issueOfCounts(strata);
  if (issue) {
    return failure(issue);
  }
  if (!weighted.ok) {
    return weighted;
  }
  const empty = emptyGroup(weighted.value);
  return empty ? failure(empty) : success(estimates(weighted.value, level));
}

function issueOfCounts(strata: StratifiedTable): EstimationIssue | null {
  const issues = strata.map(({ table }) => issueOfTable(table));
  return issues.find((issue) => issue?.code === 'invalidCounts') ?? null;
}

function emptyGroup(weighted: readonly WeightedStratum[]): EstimationIssue | null {
  for (const { stratum } of weighted) {
    const issue = issueOfTable(stratum.table);
    if (issue) {
      const facts = { stratum: stratum.id, group: String(issue.facts?.group ?? '') };
      return { code: 'emptyGroupInStratum', facts };
    }
  }
  return null;
}

/** A standardised risk with its variance. */
interface Standardised {
  readonly risk: number;
  readonly variance: number;
}

function estimates(weighted: readonly WeightedStratum[], level: number): StandardisedRisks {
  const index = standardise(weighted, 'index');
  const reference = standardise(weighted, 'reference');
  return {
    shares: Object.fromEntries(weighted.map(({ stratum, share }) => [stratum.id, share])),
    index: symmetric(index.risk, index.variance, [0, 1], level),
    reference: symmetric(reference.risk, reference.variance, [0, 1], level),
    difference: symmetric(
      index.risk - reference.risk,
      index.variance + reference.variance,
      [-1, 1],
      level,
    ),
    ratio: ratioOf(index, reference, level),
  };
}

function standardise(
  weighted: readonly WeightedStratum[],
  side: 'index' | 'reference',
): Standardised {
  const sumOver = (part: (count: GroupCount, share: number) => number): number =>
    weighted.reduce((sum, { stratum, share }) => sum + part(stratum.table[side], share), 0);
  return {
    risk: sumOver(({ events, total }, share) => share * (events / total)),
    variance: sumOver((count, share) => share * share * varianceOfRisk(count)),
  };
}

function symmetric(
  value: number,
  variance: number,
  [least, most]: readonly [number, number],
  level: number,
): Result<Estimate, EstimationIssue> {
  if (variance === 0) {
    return failure({ code: 'zeroCell' });
  }
  const spread = criticalValue(level) * Math.sqrt(variance);
  const [lower, upper] = clampLimits([value - spread, value + spread], least, most);
  return success({ value, interval: { lower, upper, level, method: STANDARDISATION.id } });
}

function ratioOf(
  index: Standardised,
  reference: Standardised,
  level: number,
): Result<Estimate, EstimationIssue> {
  if (index.risk === 0 || reference.risk === 0 || index.variance + reference.variance === 0) {
    return failure({ code: 'zeroCell' });
  }
  const value = index.risk / reference.risk;
  const variance = index.variance / index.risk ** 2 + reference.variance / reference.risk ** 2;
  const factor = Math.exp(criticalValue(level) * Math.sqrt(variance));
  const method = STANDARDISATION.id;
  return success({
    value,
    interval: { lower: value / factor, upper: value * factor, level, method },
  });
}
