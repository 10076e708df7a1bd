export type { IntervalMethod, MethodWords } from './interval-method';
export { ODDS_RATIO_INTERVALS } from './odds-ratio';
export type { OddsRatioIntervalId } from './odds-ratio';
export { RISK_INTERVALS } from './risk';
export type { RiskIntervalId } from './risk';
export { RISK_DIFFERENCE_INTERVALS } from './risk-difference';
export type { RiskDifferenceIntervalId } from './risk-difference';
export { RISK_RATIO_INTERVALS } from './risk-ratio';
export type { RiskRatioIntervalId } from './risk-ratio';
