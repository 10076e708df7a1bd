import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import type { EstimationIssue } from '../estimate';

/** A risk ratio with its limits; the confidence level does not matter here. */
export interface RatioWithLimits {
  readonly value: number;
  readonly lower: number;
  readonly upper: number;
}

/**
 * E-values of a risk ratio and of its limit nearer to 1, each at least 1. They speak of what an
 * unmeasured confounder would have to do, so that words that show them must give that reading.
 */
export interface EValue {
  readonly ofValue: number;
  /** 1 where the limits hold 1. */
  readonly ofLimit: number;
  readonly needsCausalReading: true;
}

/** Source of the E-value. */
export const E_VALUE_CITATION =
  'VanderWeele TJ, Ding P. Sensitivity analysis in observational research: introducing the ' +
  'E-value. Annals of Internal Medicine 2017;167:268-274.';

/**
 * E-value: how strongly, as a risk ratio with both exposure and outcome, an unmeasured confounder
 * would have to be tied to them to explain a risk ratio away.
 *
 * Takes a ratio and limits above 0, in order; any other gives `invalidCounts`. For an odds ratio of
 * a common outcome give its square root (and those of its limits).
 *
 * Source: VanderWeele and Ding (2017) Annals of Internal Medicine 167:268-274.
 * Example: 3.9 (1.8 to 8.7) gives 7.26, and 3.0 for the limit.
 */
export function eValue(ratio: RatioWithLimits): Result<EValue, EstimationIssue> {
  const { value, lower, upper } = ratio;
  if (!(lower > 0 && lower <= value && value <= upper && Number.isFinite(upper))) {
    return failure({ code: 'invalidCounts' });
  }
  const holdsOne = lower <= 1 && upper >= 1;
  const nearer = value >= 1 ? lower : upper;
  const ofLimit = holdsOne ? 1 : eValueOf(nearer);
  return success({ ofValue: eValueOf(value), ofLimit, needsCausalReading: true });
}

function eValueOf(ratio: number): number {
  const above = ratio < 1 ? 1 / ratio : ratio;
  return above + Math.sqrt(above * (above - 1));
}
