export { DIFFERENCES_OF_DIFFERENCES } from './difference-of-differences';
export type { DifferenceOfDifferences } from './difference-of-differences';
export { EXCESS_RISK, excessRisk } from './excess-risk';
export type { ExcessFrom, TwoFactorCounts } from './excess-risk';
export type { Interaction } from './interaction';
export { RATIO_OF_RATIOS, ratioOfRatios } from './ratio-of-ratios';
export type { RatioCompared } from './ratio-of-ratios';
