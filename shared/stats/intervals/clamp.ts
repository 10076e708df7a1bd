import type { Limits } from './interval-method';

/** Keeps limits inside the range that the estimand can take. */
export function clampLimits([lower, upper]: Limits, least: number, most: number): Limits {
  return [Math.max(least, lower), Math.min(most, upper)];
}
