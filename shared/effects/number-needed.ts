import type { Estimate } from '#shared/stats';
import type { ExactFraction } from './effect-measure';

/**
 * How many in the index group instead of the reference group make one more, or one fewer, event.
 * Null stands for infinity (no difference, or a limit at exactly 0).
 */
export interface NumberNeededSide {
  readonly change: 'more' | 'fewer';
  readonly count: number | null;
}

/**
 * A number needed with its limits. `oneSided`: from `nearest`, the smaller number, to `farthest`.
 * `throughInfinity`: the risk difference's limits lie on both sides of 0, so the numbers run from
 * `fewer` up through infinity and down to `more`.
 */
export interface NumberNeeded {
  readonly value: NumberNeededSide;
  readonly limits:
    | {
        readonly kind: 'oneSided';
        readonly change: 'more' | 'fewer';
        readonly nearest: number | null;
        readonly farthest: number | null;
      }
    | { readonly kind: 'throughInfinity'; readonly fewer: number; readonly more: number };
}

/**
 * The number needed of a risk difference with its limits.
 *
 * Whole numbers: the value is rounded up (exactly, from the fraction where there is one), limits
 * away from the value (nearest down, farthest up), after snapping to 12 significant digits.
 *
 * Source: Altman (1998) British Medical Journal 317:1309-1312.
 * Example: 0.1 (-0.05 to 0.25) gives 10 for one more, limits 20 for one fewer through infinity to 4
 * for one more.
 */
export function numberNeeded(estimate: Estimate, exact: ExactFraction | null): NumberNeeded {
  return { value: valueSide(estimate.value, exact), limits: limitsOf(estimate) };
}

function valueSide(difference: number, exact: ExactFraction | null): NumberNeededSide {
  const change = difference < 0 ? 'fewer' : 'more';
  if (difference === 0) {
    return { change, count: null };
  }
  return { change, count: exact ? exactCeiling(exact) : Math.ceil(inverse(difference)) };
}

function exactCeiling({ numerator, denominator }: ExactFraction): number {
  const size = Math.abs(numerator);
  const rest = denominator % size;
  return (denominator - rest) / size + (rest > 0 ? 1 : 0);
}

function limitsOf({ interval }: Estimate): NumberNeeded['limits'] {
  const { lower, upper } = interval;
  if (lower < 0 && upper > 0) {
    return {
      kind: 'throughInfinity',
      fewer: Math.floor(inverse(lower)),
      more: Math.floor(inverse(upper)),
    };
  }
  const smallest = Math.min(Math.abs(lower), Math.abs(upper));
  const largest = Math.max(Math.abs(lower), Math.abs(upper));
  return {
    kind: 'oneSided',
    change: upper > 0 ? 'more' : 'fewer',
    nearest: largest === 0 ? null : Math.floor(inverse(largest)),
    farthest: smallest === 0 ? null : Math.ceil(inverse(smallest)),
  };
}

/** 1 / |x| without the last digits that rounding errors live in. */
function inverse(x: number): number {
  return Number((1 / Math.abs(x)).toPrecision(12));
}
