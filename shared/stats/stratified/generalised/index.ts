export { generalAssociation } from './general-association';
export type { ContingencyStratum, StratifiedContingency } from './generalised-test';
export { rowMeanScores } from './row-mean-scores';
export { scoreCorrelation } from './score-correlation';
export type { TableScores } from './score-correlation';
export { GENERALISED_TESTS } from './words';
