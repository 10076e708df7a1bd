import { assertNever } from '#shared/core';
import type { Quantity } from '#shared/analysis';

/** A fraction of whole numbers of any size; `denominator > 0`. */
export interface Rational {
  readonly numerator: bigint;
  readonly denominator: bigint;
}

/** A quantity as an exact fraction; reals are first snapped to 12 significant digits. */
export function rationalOf(quantity: Quantity): Rational {
  switch (quantity.kind) {
    case 'fraction':
      return {
        numerator: BigInt(quantity.numerator),
        denominator: BigInt(quantity.denominator),
      };
    case 'count':
      return { numerator: BigInt(quantity.count), denominator: 1n };
    case 'real':
      return snapped(quantity.value);
    default:
      return assertNever(quantity);
  }
}

/**
 * Engines differ in the last digits of exp and log, so that a tie must not hang on them: twelve
 * digits are the same everywhere.
 */
function snapped(value: number): Rational {
  const [digits = '0', exponent = '0'] = value.toExponential(11).split('e');
  const mantissa = BigInt(digits.replace('.', ''));
  const power = Number(exponent) - 11;
  return power < 0
    ? { numerator: mantissa, denominator: 10n ** BigInt(-power) }
    : { numerator: mantissa * 10n ** BigInt(power), denominator: 1n };
}
