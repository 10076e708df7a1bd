export { addressKey, parseAddress, scopeKey } from './address-key';
export type { AnalysisIssue, AnalysisIssueCode } from './analysis-issue';
export type {
  AnalysisResult,
  ContrastResult,
  LayerResult,
  LevelResult,
  OutcomeWords,
  PooledContrastResult,
  ResultFrame,
  StratumLeftOut,
} from './analysis-result';
export { contrastTestId, homogeneityId, poolingId, takesTime, trendTestId } from './chosen-methods';
export { computeAnalysis } from './compute-analysis';
export {
  DEFAULT_INTERVAL_METHODS,
  DEFAULT_STANDING,
  defaultSpecification,
  reverseContrast,
} from './default-specification';
export { ENGINE_VERSION } from './engine-version';
export { keptLevels } from './factor-levels';
export { frameOf } from './frame';
export type { FrameStudy } from './frame';
export { GUARDS, NOTHING_KNOWN, findGuards } from './guards';
export type { GuardFinding, GuardId } from './guards';
export type {
  Guard,
  GuardContext,
  GuardFact,
  GuardFacts,
  GuardPlace,
  GuardPoint,
  GuardSeverity,
} from './guards/guard';
export { listValues } from './list-values';
export type { AddressedValue } from './list-values';
export { poolOver } from './pool-over';
export type { PoolingSetting } from './pool-over';
export { printedTest } from './printed-test';
export type { PrintedTest } from './printed-test';
export { numberOf } from './quantity';
export type { Quantity } from './quantity';
export { fractionInExposedAt } from './read-impact';
export type { ImpactPlace } from './read-impact';
export { readValue } from './read-value';
export type { ValueIssue } from './read-value';
export { contrastStrata, contrastTable, layerAt, pooledAt } from './result-places';
export type {
  Adjustment,
  AnalysisSpecification,
  AnalysisStanding,
  IntervalMethodChoice,
  OtherMethodChoice,
} from './specification';
export { tallyRequestOf } from './tally-request';
export { isAddressFacet, isAddressedQuantity } from './value-address';
export type {
  AddressedQuantity,
  AddressFacet,
  CaseControlQuantity,
  ResultScope,
  ValueAddress,
} from './value-address';
