import type { HouseStyle } from '#shared/house-style';
import type { Interval } from '#shared/stats';
import { rationalOf } from './rational';
import { roundRational } from './round';

/** The most decimals that a whole column gains for the sake of one limit. */
export const MOST_EXTRA_DECIMALS = 2;

/** Beyond this a limit is the null value for every reader. */
const MOST_DECIMALS = 9;

/** The scale on which limits are printed, and its value of no difference. */
export interface NullScale {
  readonly nullValue: 0 | 1;
  readonly scale: number;
  readonly decimals: number;
}

/**
 * The decimals, at least `decimals`, at which no limit is printed as the null value unless it is
 * the null value: 0.996 is not 1.00.
 */
export function decimalsOffTheNull(
  interval: Interval,
  { nullValue, scale, decimals }: NullScale,
  style: HouseStyle,
): number {
  const needed = [interval.lower, interval.upper].map((limit) => {
    let tried = decimals;
    while (
      tried < MOST_DECIMALS &&
      meetsNull(limit, { nullValue, scale, decimals: tried }, style)
    ) {
      tried += 1;
    }
    return tried === MOST_DECIMALS ? decimals : tried;
  });
  return Math.max(...needed);
}

function meetsNull(limit: number, scale: NullScale, style: HouseStyle): boolean {
  if (limit === scale.nullValue) {
    return false;
  }
  const { rounding } = style.numbers;
  const printed = roundRational(
    rationalOf({ kind: 'real', value: limit }),
    scale.scale,
    scale.decimals,
    rounding,
  );
  const atNull = BigInt(scale.nullValue * scale.scale) * 10n ** BigInt(scale.decimals);
  return printed.units === atNull;
}
