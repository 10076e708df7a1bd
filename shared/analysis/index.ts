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
export type {
  Adjustment,
  AnalysisSpecification,
  AnalysisStanding,
  IntervalMethodChoice,
} from './specification';
export type { AddressedQuantity, AddressFacet, ResultScope, ValueAddress } from './value-address';
export type { Quantity } from './quantity';
