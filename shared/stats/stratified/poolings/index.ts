export { POOLED_ODDS_RATIOS } from './odds-ratio';
export type { PooledOddsRatioId } from './odds-ratio';
export type { PoolingMethod } from './pooling-method';
export { POOLED_RISK_DIFFERENCES } from './risk-difference';
export type { PooledRiskDifferenceId } from './risk-difference';
export { POOLED_RISK_RATIOS } from './risk-ratio';
export type { PooledRiskRatioId } from './risk-ratio';
