export { cochranMantelHaenszel } from './cochran-mantel-haenszel';
export type { ContinuityCorrection } from './cochran-mantel-haenszel';
export {
  ODDS_RATIO_HOMOGENEITIES,
  RISK_DIFFERENCE_HOMOGENEITIES,
  RISK_RATIO_HOMOGENEITIES,
} from './homogeneity';
export type { HomogeneityMethod, HomogeneityTest } from './homogeneity';
export { pooledRiskDifference } from './mantel-haenszel-difference';
export type { PooledDifferenceVariance } from './mantel-haenszel-difference';
export {
  issueOfOddsRatioStratum,
  issueOfRiskRatioStratum,
  pooledOddsRatio,
  pooledRiskRatio,
} from './mantel-haenszel-ratios';
export { partStrata } from './strata-used';
export type { StrataUsed, UnusedStratum } from './strata-used';
export { POOLED_ODDS_RATIOS, POOLED_RISK_DIFFERENCES, POOLED_RISK_RATIOS } from './poolings';
export type {
  PooledOddsRatioId,
  PooledRiskDifferenceId,
  PooledRiskRatioId,
  PoolingMethod,
} from './poolings';
export {
  GENERALISED_TESTS,
  generalAssociation,
  rowMeanScores,
  scoreCorrelation,
} from './generalised';
export type { ContingencyStratum, StratifiedContingency, TableScores } from './generalised';
