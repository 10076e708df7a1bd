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
export type { Quantity } from './quantity';
export type {
  Adjustment,
  AnalysisSpecification,
  AnalysisStanding,
  IntervalMethodChoice,
} from './specification';
export { tallyRequestOf } from './tally-request';
export type { AddressedQuantity, AddressFacet, ResultScope, ValueAddress } from './value-address';
