export type { StandardPopulation, WeightedStratum } from './standard-population';
export { weightedStrata } from './standard-population';
export type { StandardisedRisks } from './standardised-risks';
export { STANDARDISATION, standardisedRisks } from './standardised-risks';
