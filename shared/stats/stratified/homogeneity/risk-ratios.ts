import { cellsOf } from '../../check-counts';
import type { EstimationIssue } from '../../estimate';
import type { FourfoldTable } from '../../fourfold-table';
import { issueOfLogRiskRatio } from '../../intervals/risk-ratio/risk-ratio-method';
import { riskRatioOf } from '../../point-estimates';
import { varianceOfLogRiskRatio } from '../../variances';
import { inverseVarianceMethod } from './inverse-variance';

/**
 * Whether the risk ratio is the same in all strata: Q of its logarithm around the inverse-variance
 * mean.
 *
 * Strata with an empty group, or where a group has no events or both have nothing else
 * (`zeroCell`), are left out and named. Fewer than two others: `fewerThanTwoStrata`.
 *
 * Source: Cochran (1954) Biometrics 10:101-129.
 */
const inverseVariance = inverseVarianceMethod({
  issueOfStratum: issueOfLogRatio,
  valueOf: (table) => Math.log(riskRatioOf(table)),
  varianceOf: varianceOfLogRiskRatio,
});

/** Tests of homogeneity of a risk ratio, in the order in which they are offered. */
export const RISK_RATIO_HOMOGENEITIES = { inverseVariance } as const;

function issueOfLogRatio(table: FourfoldTable): EstimationIssue | null {
  const cells = cellsOf(table);
  const withoutVariance = cells.indexOthers === 0 && cells.referenceOthers === 0;
  return issueOfLogRiskRatio(table) ?? (withoutVariance ? { code: 'zeroCell' } : null);
}
