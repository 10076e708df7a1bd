import { numberOf } from '#shared/analysis/quantity';
import type { Quantity } from '#shared/analysis';
import type { HouseStyle } from '#shared/house-style';
import type { NumberText, SignDisplay } from './number-text';
import { rationalOf } from './rational';
import { roundRational } from './round';
import { writeDecimal } from './write-decimal';

/** How one number is printed: the figure is the quantity times `scale`, to `decimals` decimals. */
export interface NumberForm {
  readonly scale: number;
  readonly decimals: number;
  readonly sign: SignDisplay;
}

/** Prints a quantity; rounded once, from the exact fraction where there is one. */
export function formatNumber(quantity: Quantity, form: NumberForm, style: HouseStyle): NumberText {
  const decimal = roundRational(
    rationalOf(quantity),
    form.scale,
    form.decimals,
    style.numbers.rounding,
  );
  return {
    text: writeDecimal(decimal, style.numbers, form.sign),
    value: numberOf(quantity),
    scale: form.scale,
    decimals: form.decimals,
    signed: form.sign === 'plusAndMinus',
  };
}

/** Prints a whole number, thousands grouped as the house style says: 12 345. */
export function formatCount(count: number, style: HouseStyle): NumberText {
  return formatNumber({ kind: 'count', count }, { scale: 1, decimals: 0, sign: 'minus' }, style);
}
