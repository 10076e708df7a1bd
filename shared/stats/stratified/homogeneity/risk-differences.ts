import { issueOfTable } from '../../check-counts';
import type { EstimationIssue } from '../../estimate';
import type { FourfoldTable } from '../../fourfold-table';
import { riskDifferenceOf } from '../../point-estimates';
import { varianceOfDifference } from '../../variances';
import { inverseVarianceMethod } from './inverse-variance';

/**
 * Whether the risk difference is the same in all strata: Q around the inverse-variance mean.
 *
 * Strata with an empty group, or whose difference has no variance (both risks 0 or 1, `zeroCell`),
 * are left out and named. Fewer than two others: `fewerThanTwoStrata`.
 *
 * Source: Cochran (1954) Biometrics 10:101-129.
 */
const inverseVariance = inverseVarianceMethod({
  issueOfStratum: issueOfDifference,
  valueOf: riskDifferenceOf,
  varianceOf: varianceOfDifference,
});

/** Tests of homogeneity of a risk difference, in the order in which they are offered. */
export const RISK_DIFFERENCE_HOMOGENEITIES = { inverseVariance } as const;

function issueOfDifference(table: FourfoldTable): EstimationIssue | null {
  const withoutVariance = varianceOfDifference(table) === 0;
  return issueOfTable(table) ?? (withoutVariance ? { code: 'zeroCell' } : null);
}
