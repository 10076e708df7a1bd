export type { HomogeneityMethod, HomogeneityTest } from './homogeneity-method';
export { ODDS_RATIO_HOMOGENEITIES } from './odds-ratios';
export { RISK_DIFFERENCE_HOMOGENEITIES } from './risk-differences';
export { RISK_RATIO_HOMOGENEITIES } from './risk-ratios';
