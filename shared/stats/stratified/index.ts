export { cochranMantelHaenszel } from './cochran-mantel-haenszel';
export type { ContinuityCorrection } from './cochran-mantel-haenszel';
export {
  oddsRatioHomogeneity,
  riskDifferenceHomogeneity,
  riskRatioHomogeneity,
} from './homogeneity';
export type { HomogeneityTest } from './homogeneity';
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
