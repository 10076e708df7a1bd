import { MINUS, numberOfDecimal, roundRational } from '#shared/format';
import type { Rational } from '#shared/format';
import type { NumberStyle } from '#shared/house-style';
import type { CellNumber } from '#shared/layout';

/** A number as a sheet keeps it, and the format under which it shows the printed digits. */
export interface DisplayedNumber {
  readonly value: number;
  readonly format: string;
}

/**
 * The number of a cell for a sheet: at full precision wherever the sheet's own rounding gives the
 * printed digits, else as printed (a tie that the house style rounds to the even digit, a size
 * without its sign). What is no plain number in print, as "<0.1", is shown by a literal format.
 */
export function displayedNumber(
  number: Omit<CellNumber, 'address'>,
  style: NumberStyle,
): DisplayedNumber {
  const printed = printedUnits(number.text);
  if (printed === null) {
    return { value: number.value * number.scale, format: literal(number.text) };
  }
  const scaled = number.value * number.scale;
  const shown = roundRational(rationalOfFifteenDigits(scaled), 1, number.decimals, 'halfUp');
  // A sheet shows a minus before a negative number even where nothing but zeros is left of it.
  const agrees = shown.units === printed && (printed !== 0n || scaled === 0);
  const value = agrees ? scaled : numberOfDecimal({ units: printed, decimals: number.decimals });
  return { value, format: numberFormat(number, value, style) };
}

/** The figure in whole units of its last decimal; null where it is no plain number. */
function printedUnits(text: string): bigint | null {
  const plain = text
    .replace(/[\s,.·\u202f\u00a0]/g, '')
    .replace(/^\+/, '')
    .replace(MINUS, '-');
  return /^-?\d+$/.test(plain) ? BigInt(plain) : null;
}

/** Spreadsheets round what they show from 15 significant digits. */
function rationalOfFifteenDigits(value: number): Rational {
  const [mantissa = '0', exponent = '0'] = value.toExponential(14).split('e');
  const digits = BigInt(mantissa.replace('.', ''));
  const power = Number(exponent) - 14;
  return power >= 0
    ? { numerator: digits * 10n ** BigInt(power), denominator: 1n }
    : { numerator: digits, denominator: 10n ** BigInt(-power) };
}

function numberFormat(
  { decimals, signed }: Pick<CellNumber, 'decimals' | 'signed'>,
  value: number,
  style: NumberStyle,
): string {
  const whole = Math.trunc(Math.abs(value)).toString().length;
  const figure = grouped(whole, style) + (decimals === 0 ? '' : `.${'0'.repeat(decimals)}`);
  const positive = signed ? `"+"${figure}` : figure;
  return value < 0 || signed ? `${positive};"${MINUS}"${figure};${figure}` : figure;
}

function grouped(digits: number, { thousands }: NumberStyle): string {
  if (thousands.separator === 'none' || digits < thousands.fromDigits) return '0';
  if (thousands.separator === 'comma') return '#,##0';
  const groups = Array.from({ length: Math.ceil(digits / 3) - 1 }, () => '###');
  return ['#', ...groups.slice(1), '##0'].join('"\u202f"');
}

function literal(text: string): string {
  return `"${text.replaceAll('"', '″')}"`;
}
