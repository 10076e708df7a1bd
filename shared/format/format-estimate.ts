import type { Quantity } from '#shared/analysis';
import type { EffectMeasureId } from '#shared/effects';
import type { HouseStyle } from '#shared/house-style';
import type { Estimate } from '#shared/stats';
import { DIFFERENCE_SCALES } from './difference-decimals';
import { formatNumber } from './format-number';
import type { NumberText } from './number-text';
import { decimalsOffTheNull } from './off-the-null';
import type { PrintedDecimals } from './precision';
import { numberOfDecimal, roundRational } from './round';
import { rationalOf } from './rational';
import { decimalsForTwoDigits, decimalsOfRatio } from './ratio-decimals';

/** An estimate with its limits, printed to the same decimals. */
export interface EstimateText {
  readonly value: NumberText;
  readonly lower: NumberText;
  readonly upper: NumberText;
}

/** Signs of a difference: `signed` for tables, `none` where words carry the direction. */
export type EstimateSigns = 'signed' | 'none';

/**
 * An estimate of a measure with its limits, as tables and sentences print it.
 *
 * `exact` is the estimate as a fraction of counts, null where there is none (a pooled estimate);
 * `decimals` are the analysis' `decimalsOf`. A difference is in the house style's unit. Limits
 * never round onto the null value; they get one more digit, and the estimate with them.
 */
export function formatEstimate(
  measure: EffectMeasureId,
  { estimate, exact }: { readonly estimate: Estimate; readonly exact: Quantity | null },
  decimals: PrintedDecimals,
  style: HouseStyle,
  signs: EstimateSigns = 'signed',
): EstimateText {
  const value = exact ?? { kind: 'real', value: estimate.value };
  return measure === 'riskDifference'
    ? differenceText(value, estimate, decimals.riskDifference, style, signs)
    : ratioText(value, estimate, decimals[measure], style);
}

function differenceText(
  value: Quantity,
  { interval }: Estimate,
  column: number,
  style: HouseStyle,
  signs: EstimateSigns,
): EstimateText {
  const { scale } = DIFFERENCE_SCALES[style.difference.unit];
  const decimals = decimalsOffTheNull(interval, { nullValue: 0, scale, decimals: column }, style);
  const print = (quantity: Quantity, sign: 'minus' | 'plusAndMinus'): NumberText =>
    formatNumber(quantity, { scale, decimals, sign: signs === 'none' ? 'none' : sign }, style);
  return {
    value: print(value, 'plusAndMinus'),
    lower: print({ kind: 'real', value: interval.lower }, 'minus'),
    upper: print({ kind: 'real', value: interval.upper }, 'minus'),
  };
}

function ratioText(
  value: Quantity,
  estimate: Estimate,
  column: number,
  style: HouseStyle,
): EstimateText {
  const decimals = decimalsOfRatio(estimate, column, style);
  const print = (quantity: Quantity, places: number): NumberText =>
    formatNumber(quantity, { scale: 1, decimals: places, sign: 'minus' }, style);
  const limit = (bound: number): NumberText =>
    print({ kind: 'real', value: bound }, limitDecimals(bound, decimals, style));
  return {
    value: print(value, decimals),
    lower: limit(estimate.interval.lower),
    upper: limit(estimate.interval.upper),
  };
}

/** A limit that would print as zero keeps two significant digits of its own. */
function limitDecimals(limit: number, decimals: number, style: HouseStyle): number {
  const printed = roundRational(
    rationalOf({ kind: 'real', value: limit }),
    1,
    decimals,
    style.numbers.rounding,
  );
  const vanishes = limit > 0 && numberOfDecimal(printed) === 0;
  return vanishes ? decimalsForTwoDigits(limit) : decimals;
}
