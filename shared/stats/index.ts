export { ADJUSTMENTS, adjustPValues } from './adjustments';
export type { Adjustment, AdjustmentId } from './adjustments';
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
export { conditionalOddsRatioOf } from './conditional';
export type { MethodEffort } from './method-effort';
export { oddsRatioOf, riskDifferenceOf, riskRatioOf } from './point-estimates';
export { POOLING_METHODS, TEST_METHODS } from './method-words';
export type { PoolingMethodId, TestMethodId } from './method-words';
export {
  ODDS_RATIO_HOMOGENEITIES,
  POOLED_ODDS_RATIOS,
  POOLED_RISK_DIFFERENCES,
  POOLED_RISK_RATIOS,
  RISK_DIFFERENCE_HOMOGENEITIES,
  RISK_RATIO_HOMOGENEITIES,
  cochranMantelHaenszel,
  generalAssociation,
  issueOfOddsRatioStratum,
  issueOfRiskRatioStratum,
  partStrata,
  pooledOddsRatio,
  pooledRiskDifference,
  pooledRiskRatio,
  rowMeanScores,
  scoreCorrelation,
} from './stratified';
export type {
  ContingencyStratum,
  ContinuityCorrection,
  HomogeneityMethod,
  HomogeneityTest,
  PooledDifferenceVariance,
  PooledOddsRatioId,
  PooledRiskDifferenceId,
  PooledRiskRatioId,
  PoolingMethod,
  StrataUsed,
  StratifiedContingency,
  TableScores,
  UnusedStratum,
} from './stratified';
export {
  FOURFOLD_TESTS,
  fisherOfFourfold,
  pearsonOfFourfold,
  pearsonOfTable,
} from './tests-of-association';
export type { FourfoldTest, FourfoldTestId } from './tests-of-association';
export { allEventsLowerLimit, zeroEventsUpperLimit } from './zero-events-limit';
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
export {
  MATCHED_ODDS_RATIO_INTERVALS,
  PAIRED_DIFFERENCE_INTERVALS,
  PAIRED_TESTS,
  issueOfPairs,
  matchedOddsRatioOf,
  pairedDifferenceOf,
  pairsOf,
} from './pairs';
export type {
  MatchedOddsRatioIntervalId,
  PairedDifferenceIntervalId,
  PairedTable,
  PairedTest,
  PairedTestId,
} from './pairs';
export {
  adjustedResiduals,
  cramersV,
  fisherOfTable,
  likelihoodRatioOfTable,
} from './tables-of-any-size';
export { TREND_TESTS, cochranArmitage, linearByLinear } from './trend';
export type { ScoredTable, TrendTest, TrendTestId } from './trend';
export {
  DIFFERENCES_OF_DIFFERENCES,
  EXCESS_RISK,
  RATIO_OF_RATIOS,
  excessRisk,
  ratioOfRatios,
} from './interaction';
export type {
  DifferenceOfDifferences,
  ExcessFrom,
  Interaction,
  RatioCompared,
  TwoFactorCounts,
} from './interaction';
export { STANDARDISATION, standardisedRisks, weightedStrata } from './standardised';
export type { StandardPopulation, StandardisedRisks, WeightedStratum } from './standardised';
