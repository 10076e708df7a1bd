export { cellsOf, issueOfGroup, issueOfTable, marginsOf } from './check-counts';
export type { FourfoldCells, FourfoldMargins } from './check-counts';
export type { ContingencyTable, ScoredGroup } from './contingency-table';
export {
  betaCumulative,
  betaQuantile,
  chiSquareUpperTail,
  criticalValue,
  hypergeometricProbability,
  logGamma,
  normalCumulative,
  normalQuantile,
  normalUpperTail,
} from './distributions';
export type { Urn } from './distributions';
export type {
  Estimate,
  EstimationIssue,
  EstimationIssueCode,
  Interval,
  TestOutcome,
} from './estimate';
export type { FourfoldTable, GroupCount, StratifiedTable, TableStratum } from './fourfold-table';
export {
  E_VALUE_CITATION,
  IMPACT_METHODS,
  eValue,
  fractionInExposed,
  fractionOfExposedCases,
  levinFraction,
  populationFraction,
} from './impact';
export type {
  EValue,
  ImpactEstimate,
  LevinParts,
  RatioAdjustment,
  RatioWithLimits,
  Sampling,
} from './impact';
export {
  ODDS_RATIO_INTERVALS,
  RISK_DIFFERENCE_INTERVALS,
  RISK_INTERVALS,
  RISK_RATIO_INTERVALS,
} from './intervals';
export type {
  IntervalMethod,
  MethodWords,
  OddsRatioIntervalId,
  RiskDifferenceIntervalId,
  RiskIntervalId,
  RiskRatioIntervalId,
} from './intervals';
export { oddsRatioOf, riskDifferenceOf, riskRatioOf } from './point-estimates';
export { POOLING_METHODS, TEST_METHODS } from './method-words';
export type { PoolingMethodId, TestMethodId } from './method-words';
export {
  cochranMantelHaenszel,
  issueOfOddsRatioStratum,
  issueOfRiskRatioStratum,
  oddsRatioHomogeneity,
  partStrata,
  pooledOddsRatio,
  pooledRiskDifference,
  pooledRiskRatio,
  riskDifferenceHomogeneity,
  riskRatioHomogeneity,
} from './stratified';
export type {
  ContinuityCorrection,
  HomogeneityTest,
  PooledDifferenceVariance,
  StrataUsed,
  UnusedStratum,
} from './stratified';
export {
  cochranArmitage,
  fisherOfFourfold,
  pearsonOfFourfold,
  pearsonOfTable,
} from './tests-of-association';
export {
  RATE_DIFFERENCE_INTERVALS,
  RATE_INTERVALS,
  RATE_RATIO_INTERVALS,
  RATE_STANDARDISATION,
  issueOfRateRatioStratum,
  pooledRateDifference,
  pooledRateRatio,
  rateDifferenceOf,
  rateOf,
  rateRatioOf,
  standardisedRate,
} from './rates';
export type {
  RateCount,
  RateDifferenceIntervalId,
  RateIntervalId,
  RateRatioIntervalId,
  RateStratum,
  RateTable,
  StandardisedStratum,
} from './rates';
