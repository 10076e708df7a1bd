export {
  IMPACT_METHODS,
  fractionInExposed,
  fractionOfExposedCases,
  levinFraction,
  populationFraction,
} from './attributable-fractions';
export type { LevinParts, RatioAdjustment, Sampling } from './attributable-fractions';
export { E_VALUE_CITATION, eValue } from './e-value';
export type { EValue, RatioWithLimits } from './e-value';
export type { ImpactEstimate } from './impact-estimate';
