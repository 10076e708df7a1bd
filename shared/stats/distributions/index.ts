/**
 * The distribution functions of the project, in one place. Which package each comes from was
 * decided by comparison with R to 1e-9 relative, far tails included (tests/reference-values):
 * log-gamma from jstat; error functions, incomplete gamma and beta from stdlib, because jstat's
 * normal and chi-square tails end at 1e-16 and its beta quantile holds 7 digits; the hypergeometric
 * probability after Loader, because differences of log-gammas lose digits in large tables.
 */
export { betaCumulative, betaQuantile } from './beta';
export { binomialCumulative, binomialProbability } from './binomial';
export { binomialTerms } from './binomial-terms';
export type { BinomialTerms, CountRange } from './binomial-terms';
export { chiSquareUpperTail } from './chi-square';
export { gammaQuantile, gammaUpperQuantile } from './gamma';
export {
  deviance,
  hypergeometricProbability,
  hypergeometricSupport,
  logHypergeometric,
  logHypergeometricWeight,
} from './hypergeometric';
export type { Urn } from './hypergeometric';
export { logGamma } from './log-gamma';
export { criticalValue, normalCumulative, normalQuantile, normalUpperTail } from './normal';
