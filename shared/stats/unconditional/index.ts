export { differences, logRatios } from './null-family';
export type { NullFamily } from './null-family';
export { largestProbability, tableMask } from './table-mask';
export {
  UNCONDITIONAL_CAP,
  issueOfUnconditional,
  unconditionalDifferenceLimits,
  unconditionalRatioLimits,
} from './unconditional-intervals';
export { unconditionalLowerLimit, unconditionalPValue } from './unconditional-limit';
export type { UnconditionalTest } from './unconditional-limit';
