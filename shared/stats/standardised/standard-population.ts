import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import type { EstimationIssue } from '../estimate';
import type { StratifiedTable, TableStratum } from '../fourfold-table';

/**
 * Whose strata the risks are standardised to: the two groups together, one of them, or a chosen
 * population with a share for each stratum id (any non-negative numbers: members, or shares).
 */
export type StandardPopulation =
  | { readonly kind: 'total' | 'index' | 'reference' }
  | { readonly kind: 'chosen'; readonly shares: Readonly<Record<string, number>> };

/** A stratum with its share in the standard population. */
export interface WeightedStratum {
  readonly stratum: TableStratum;
  /** Above 0; all shares sum to 1. */
  readonly share: number;
}

/**
 * The strata of a standard population with their shares; strata without a share in it are not
 * there.
 *
 * A chosen population that leaves a stratum without a share (0 is one), names one that is not
 * there, has a share below 0 or none above it, gives `invalidWeights` with the `stratum`'s id where
 * there is one. A total of an analysis of several levels is a chosen population of its members.
 */
export function weightedStrata(
  strata: StratifiedTable,
  population: StandardPopulation,
): Result<readonly WeightedStratum[], EstimationIssue> {
  const issue = population.kind === 'chosen' ? issueOfShares(strata, population.shares) : null;
  if (issue) {
    return failure(issue);
  }
  const sizes = strata.map((stratum) => sizeIn(stratum, population));
  const total = sizes.reduce((sum, size) => sum + size, 0);
  if (!(total > 0 && Number.isFinite(total))) {
    return failure({ code: 'invalidWeights' });
  }
  const weighted = strata.map((stratum, at) => ({ stratum, share: (sizes[at] ?? 0) / total }));
  return success(weighted.filter(({ share }) => share > 0));
}

function issueOfShares(
  strata: StratifiedTable,
  shares: Readonly<Record<string, number>>,
): EstimationIssue | null {
  const ids = strata.map(({ id }) => id);
  const isShare = (id: string): boolean =>
    Object.hasOwn(shares, id) && Number.isFinite(shares[id]) && (shares[id] ?? -1) >= 0;
  const wrong =
    ids.find((id) => !isShare(id)) ?? Object.keys(shares).find((id) => !ids.includes(id));
  return wrong === undefined ? null : { code: 'invalidWeights', facts: { stratum: wrong } };
}

function sizeIn({ id, table }: TableStratum, population: StandardPopulation): number {
  switch (population.kind) {
    case 'total':
      return table.index.total + table.reference.total;
    case 'index':
    case 'reference':
      return table[population.kind].total;
    case 'chosen':
      return population.shares[id] ?? 0;
  }
}
