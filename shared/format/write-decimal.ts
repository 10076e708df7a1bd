import type { NumberStyle } from '#shared/house-style';
import { MINUS, NARROW_NO_BREAK_SPACE, type SignDisplay } from './number-text';
import type { Decimal } from './round';

/** Writes a rounded number under a house style; zero has no sign. */
export function writeDecimal(
  decimal: Decimal,
  style: NumberStyle,
  sign: SignDisplay = 'minus',
): string {
  const { whole, fraction } = digitsOf(decimal);
  const figure = grouped(whole, style) + (fraction === '' ? '' : style.decimalMark + fraction);
  return signOf(decimal.units, sign) + figure;
}

/** The digits on both sides of the decimal mark, without sign. */
function digitsOf({ units, decimals }: Decimal): { whole: string; fraction: string } {
  const size = (units < 0n ? -units : units).toString().padStart(decimals + 1, '0');
  const cut = size.length - decimals;
  return { whole: size.slice(0, cut), fraction: size.slice(cut) };
}

const SEPARATORS: Readonly<Record<NumberStyle['thousands']['separator'], string>> = {
  none: '',
  narrowSpace: NARROW_NO_BREAK_SPACE,
  comma: ',',
};

function grouped(whole: string, { thousands }: NumberStyle): string {
  return whole.length < thousands.fromDigits
    ? whole
    : whole.replace(/\B(?=(\d{3})+$)/g, SEPARATORS[thousands.separator]);
}

function signOf(units: bigint, sign: SignDisplay): string {
  if (units === 0n || sign === 'none') {
    return '';
  }
  return units < 0n ? MINUS : sign === 'plusAndMinus' ? '+' : '';
}
