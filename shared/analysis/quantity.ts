import { assertNever } from '#shared/core';

/**
 * One number of a result, exact where the counts make it exact. Formatting rounds fractions and
 * counts exactly and snaps reals to 12 significant digits.
 *
 * Shape: the parts of a `fraction` are whole numbers within 2^53, `denominator > 0`, not reduced,
 * the sign in the numerator; where the products of the counts are larger than that the quantity is
 * `real`. A `count` is a whole number, a `real` is finite.
 */
export type Quantity =
  | { readonly kind: 'fraction'; readonly numerator: number; readonly denominator: number }
  | { readonly kind: 'count'; readonly count: number }
  | { readonly kind: 'real'; readonly value: number };

/** The nearest double of a quantity. */
export function numberOf(quantity: Quantity): number {
  switch (quantity.kind) {
    case 'fraction':
      return quantity.numerator / quantity.denominator;
    case 'count':
      return quantity.count;
    case 'real':
      return quantity.value;
    default:
      return assertNever(quantity);
  }
}
