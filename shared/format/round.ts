import type { NumberStyle } from '#shared/house-style';
import type { Rational } from './rational';

/** A number as whole units of its last decimal: -12.3 is `{ units: -123n, decimals: 1 }`. */
export interface Decimal {
  readonly units: bigint;
  readonly decimals: number;
}

/**
 * Rounds `value * scale` once, by whole-number arithmetic: ties go away from zero or to the even
 * digit. `scale` is a whole number (100 for percent); there is no negative zero.
 */
export function roundRational(
  value: Rational,
  scale: number,
  decimals: number,
  rounding: NumberStyle['rounding'],
): Decimal {
  const scaled = value.numerator * BigInt(scale) * 10n ** BigInt(decimals);
  const size = scaled < 0n ? -scaled : scaled;
  const quotient = size / value.denominator;
  const twiceRest = 2n * (size % value.denominator);
  const up =
    twiceRest > value.denominator ||
    (twiceRest === value.denominator && (rounding === 'halfUp' || quotient % 2n === 1n));
  const rounded = up ? quotient + 1n : quotient;
  return { units: scaled < 0n ? -rounded : rounded, decimals };
}

/** A decimal as the nearest double. */
export function numberOfDecimal({ units, decimals }: Decimal): number {
  return Number(`${units.toString()}e${String(-decimals)}`);
}
