import { failure } from '#shared/core';
import type { Result } from '#shared/core';
import type { Estimate, EstimationIssue } from '../../../estimate';
import type { StratifiedTable } from '../../../fourfold-table';
import { STANDARDISATION, standardisedRisks } from '../../../standardised/standardised-risks';
import type { StandardPopulation } from '../../../standardised/standard-population';
import type { PoolingMethod } from '../pooling-method';

/** What of the standardised risks is pooled. */
type Standardised = 'difference' | 'ratio';

/** Names of the ways to standardise, the same for differences and ratios. */
const WORDS = {
  standardisedToAll: {
    label: 'Direct standardisation to all records of the analysis, delta-method limits',
    shortLabel: 'standardised to all records',
  },
  standardisedToIndex: {
    label: 'Direct standardisation to the strata of the compared group, delta-method limits',
    shortLabel: 'standardised to the compared group',
  },
  standardisedToReference: {
    label: 'Direct standardisation to the strata of the reference group, delta-method limits',
    shortLabel: 'standardised to the reference group',
  },
  standardisedToChosen: {
    label: 'Direct standardisation to a chosen population, delta-method limits',
    shortLabel: 'standardised to a chosen population',
  },
} as const;

type StandardisedId = keyof typeof WORDS;

/** The shares of the strata in each standard population; null where none was chosen. */
const POPULATIONS: Readonly<
  Record<StandardisedId, (strata: StratifiedTable) => StandardPopulation | null>
> = {
  standardisedToAll: (strata) => ({
    kind: 'chosen',
    shares: sharesBy(strata, ({ table, members }) => {
      return members ?? table.index.total + table.reference.total;
    }),
  }),
  standardisedToIndex: () => ({ kind: 'index' }),
  standardisedToReference: () => ({ kind: 'reference' }),
  standardisedToChosen: (strata) =>
    strata.some(({ share }) => share === undefined)
      ? null
      : { kind: 'chosen', shares: sharesBy(strata, ({ share }) => share ?? 0) },
};

/**
 * Ways to pool a difference or a ratio of risks by direct standardisation, one a standard
 * population, as members of the poolings' registers.
 *
 * Each takes events and totals by stratum, with the stratum's `members` in the whole analysis for
 * the population of all records, and its `share` for a chosen one (without it: `invalidWeights`).
 * No stratum is left out: one in which a group is empty gives `emptyGroupInStratum`.
 *
 * Source: Fleiss, Levin and Paik (2003) Statistical Methods for Rates and Proportions, chapter 19.
 */
export function standardisedPoolings(
  what: Standardised,
): Readonly<Record<StandardisedId, PoolingMethod>> {
  const poolingOf = <Id extends StandardisedId>(id: Id): PoolingMethod & { readonly id: Id } => ({
    id,
    ...WORDS[id],
    citation: STANDARDISATION.citation,
    issueOfStratum: () => null,
    pooled: (strata, level) => named(standardise(strata, id, what, level), id),
  });
  return {
    standardisedToAll: poolingOf('standardisedToAll'),
    standardisedToIndex: poolingOf('standardisedToIndex'),
    standardisedToReference: poolingOf('standardisedToReference'),
    standardisedToChosen: poolingOf('standardisedToChosen'),
  };
}

function standardise(
  strata: StratifiedTable,
  id: StandardisedId,
  what: Standardised,
  level: number,
): Result<Estimate, EstimationIssue> {
  const population = POPULATIONS[id](strata);
  if (population === null) {
    return failure({ code: 'invalidWeights' });
  }
  const risks = standardisedRisks(strata, population, level);
  return risks.ok ? risks.value[what] : risks;
}

/** The limits under the name of the way that was chosen. */
function named(
  estimate: Result<Estimate, EstimationIssue>,
  method: StandardisedId,
): Result<Estimate, EstimationIssue> {
  if (!estimate.ok) {
    return estimate;
  }
  const { value, interval } = estimate.value;
  return { ok: true, value: { value, interval: { ...interval, method } } };
}

function sharesBy(
  strata: StratifiedTable,
  shareOf: (stratum: StratifiedTable[number]) => number,
): Readonly<Record<string, number>> {
  return Object.fromEntries(strata.map((stratum) => [stratum.id, shareOf(stratum)]));
}
