import type { DifferenceUnit, HouseStyle } from '#shared/house-style';
import type { Estimate } from '#shared/stats';
import { decimalsOffTheNull, MOST_EXTRA_DECIMALS } from './off-the-null';

/** What a proportion is multiplied by to be printed in a unit, and the decimals that this saves. */
export const DIFFERENCE_SCALES: Readonly<
  Record<DifferenceUnit, { readonly scale: number; readonly fewerDecimals: number }>
> = {
  percentagePoints: { scale: 100, fewerDecimals: 0 },
  per100: { scale: 100, fewerDecimals: 0 },
  per1000: { scale: 1000, fewerDecimals: 1 },
  per10000: { scale: 10_000, fewerDecimals: 2 },
};

/** The decimals of all differences of an analysis, in the unit of the house style. */
export function differenceDecimals(
  estimates: readonly Estimate[],
  percentDecimals: number,
  style: HouseStyle,
): number {
  const { scale, fewerDecimals } = DIFFERENCE_SCALES[style.difference.unit];
  const fewest = Math.max(0, percentDecimals - fewerDecimals);
  const needed = estimates.map(({ interval }) =>
    decimalsOffTheNull(interval, { nullValue: 0, scale, decimals: fewest }, style),
  );
  return Math.min(Math.max(fewest, ...needed), fewest + MOST_EXTRA_DECIMALS);
}
