const MOST_STEPS = 200;

/** Two places around a zero: the function is above zero at one and not at the other. */
interface Bracket {
  readonly newest: number;
  readonly newestValue: number;
  readonly opposite: number;
  readonly oppositeValue: number;
}

/**
 * Where a decreasing function passes zero, between two ends, to the last bits of a double.
 *
 * Gives the end when the function does not change sign inside: the function's zero then lies on or
 * beyond that end. Steps are bisections, or inverse quadratic interpolations where those are safe,
 * so that about ten evaluations do; jumps and infinite values are borne.
 * Source: Chandrupatla (1997) Advances in Engineering Software 28:145-149.
 */
export function zeroOfDecreasing(
  valueAt: (x: number) => number,
  lower: number,
  upper: number,
): number {
  const ends = endsOf(valueAt, lower, upper);
  return typeof ends === 'number' ? ends : zeroInside(valueAt, ends, 0.5);
}

/** A place and the value of the function there. */
export interface KnownPlace {
  readonly x: number;
  readonly value: number;
}

/**
 * The same between a place whose value is known and an end on either side of it, for a function
 * that is nearly straight around its zero: sought in steps from the place, the first of a given
 * width, so that about seven evaluations do.
 */
export function zeroOfDecreasingFrom(
  valueAt: (x: number) => number,
  known: KnownPlace,
  end: number,
  firstWidth: number,
): number {
  const isAbove = known.value > 0;
  if (end === known.x || isAbove !== end > known.x) {
    return known.x;
  }
  let near = known;
  let width = firstWidth;
  for (;;) {
    const x = isAbove ? Math.min(end, near.x + width) : Math.max(end, near.x - width);
    const value = valueAt(x);
    if (value > 0 !== isAbove) {
      const ends = { newest: x, newestValue: value, opposite: near.x, oppositeValue: near.value };
      return zeroInside(valueAt, ends, value / (value - near.value));
    }
    if (x === end) {
      return end;
    }
    width = nextWidth(width, near.value, value);
    near = { x, value };
  }
}

/** Somewhat farther than a straight line through two values reaches zero. */
function nextWidth(width: number, before: number, value: number): number {
  const straight = (1.2 * width * value) / (before - value);
  return straight > 0 ? Math.max(0.05 * width, Math.min(4 * width, straight)) : 4 * width;
}

/** The zero in a bracket, the first step going a given part of the way. */
function zeroInside(valueAt: (x: number) => number, ends: Bracket, firstPart: number): number {
  let { newest, newestValue, opposite, oppositeValue } = ends;
  let part = firstPart > 0 && firstPart < 1 ? firstPart : 0.5;
  for (let step = 0; step < MOST_STEPS; step += 1) {
    const x = newest + part * (opposite - newest);
    if (x === newest || x === opposite) {
      break;
    }
    const value = valueAt(x);
    let left = newest;
    let leftValue = newestValue;
    if (value > 0 !== newestValue > 0) {
      left = opposite;
      leftValue = oppositeValue;
      opposite = newest;
      oppositeValue = newestValue;
    }
    newest = x;
    newestValue = value;
    part = nextPart(newest, newestValue, opposite, oppositeValue, left, leftValue);
  }
  return Math.abs(newestValue) < Math.abs(oppositeValue) ? newest : opposite;
}

function endsOf(valueAt: (x: number) => number, lower: number, upper: number): Bracket | number {
  const atLower = valueAt(lower);
  if (!(atLower > 0) || lower === upper) {
    return lower;
  }
  const atUpper = valueAt(upper);
  return atUpper > 0
    ? upper
    : { newest: upper, newestValue: atUpper, opposite: lower, oppositeValue: atLower };
}

/** How far to go from the newest place towards the opposite one; plain numbers, for speed. */
function nextPart(
  newest: number,
  newestValue: number,
  opposite: number,
  oppositeValue: number,
  left: number,
  leftValue: number,
): number {
  const places = (newest - opposite) / (left - opposite);
  const values = (newestValue - oppositeValue) / (leftValue - oppositeValue);
  const least = Math.min(0.5, (4e-16 * Math.abs(newest)) / Math.abs(opposite - newest));
  const safe = values * values < places && (1 - values) * (1 - values) < 1 - places;
  const part = safe
    ? (newestValue / (oppositeValue - newestValue)) * (leftValue / (oppositeValue - leftValue)) +
      ((left - newest) / (opposite - newest)) *
        (newestValue / (leftValue - newestValue)) *
        (oppositeValue / (leftValue - oppositeValue))
    : 0.5;
  return Number.isFinite(part) ? Math.max(least, Math.min(1 - least, part)) : 0.5;
}
