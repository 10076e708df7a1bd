import { success } from '#shared/core';
import type { FourfoldTable, StratifiedTable } from '../../fourfold-table';
import type { HomogeneityMethod, HomogeneityParts } from './homogeneity-method';
import { homogeneityMethod } from './homogeneity-method';
import { sumOver } from '../strata-used';

/** What Q needs of a measure: a value and its variance in every stratum without issue. */
export interface InverseVarianceParts extends Pick<HomogeneityParts<string>, 'issueOfStratum'> {
  readonly valueOf: (table: FourfoldTable) => number;
  readonly varianceOf: (table: FourfoldTable) => number;
}

/**
 * Q: squared deviations from the inverse-variance mean, each over its variance. Around the
 * Mantel–Haenszel estimate it would be another number.
 */
export function inverseVarianceMethod({
  issueOfStratum,
  valueOf,
  varianceOf,
}: InverseVarianceParts): HomogeneityMethod & { readonly id: 'inverseVariance' } {
  return homogeneityMethod({
    id: 'inverseVariance',
    label: 'Inverse-variance test of homogeneity',
    shortLabel: 'inverse-variance Q',
    citation:
      'Cochran WG. The combination of estimates from different experiments. ' +
      'Biometrics 1954;10:101-129.',
    issueOfStratum,
    statistic: (used) => success(inverseVarianceQ(used, valueOf, varianceOf)),
  });
}

/** Q of any value over strata that all have a positive variance. */
export function inverseVarianceQ(
  strata: StratifiedTable,
  valueOf: (table: FourfoldTable) => number,
  varianceOf: (table: FourfoldTable) => number,
): number {
  const weights = sumOver(strata, (table) => 1 / varianceOf(table));
  const mean = sumOver(strata, (table) => valueOf(table) / varianceOf(table)) / weights;
  return sumOver(strata, (table) => (valueOf(table) - mean) ** 2 / varianceOf(table));
}
