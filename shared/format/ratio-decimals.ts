import type { HouseStyle } from '#shared/house-style';
import type { Estimate } from '#shared/stats';
import { decimalsOffTheNull, MOST_EXTRA_DECIMALS } from './off-the-null';

/** Limits below 1 pull the decimals of their estimate up to this many, not further. */
const MOST_DECIMALS_FOR_LIMITS = 2;

/** The decimals of all ratios of a column. */
export function ratioDecimals(estimates: readonly Estimate[], style: HouseStyle): number {
  const fewest = style.ratio.decimals;
  const significant = estimates.map((estimate) => decimalsForEstimate(estimate, fewest));
  const decimals = Math.min(Math.max(fewest, ...significant), fewest + 1);
  const needed = estimates.map(({ interval }) =>
    decimalsOffTheNull(interval, { nullValue: 1, scale: 1, decimals }, style),
  );
  return Math.min(Math.max(decimals, ...needed), fewest + MOST_EXTRA_DECIMALS);
}

/** The decimals of one ratio with its limits, at least those of its column. */
export function decimalsOfRatio(estimate: Estimate, column: number, style: HouseStyle): number {
  const decimals = decimalsForEstimate(estimate, column);
  return decimalsOffTheNull(estimate.interval, { nullValue: 1, scale: 1, decimals }, style);
}

/** At least two significant digits below 1: 0.16, never 0.2. */
export function decimalsForTwoDigits(value: number): number {
  if (value <= 0 || value >= 1) {
    return 0;
  }
  const exponent = Number(value.toExponential(11).split('e')[1]);
  return 1 - exponent;
}

function decimalsForEstimate({ value, interval }: Estimate, fewest: number): number {
  const forLimits = [interval.lower, interval.upper].map(decimalsForTwoDigits);
  return Math.max(
    fewest,
    decimalsForTwoDigits(value),
    Math.min(MOST_DECIMALS_FOR_LIMITS, Math.max(...forLimits)),
  );
}
