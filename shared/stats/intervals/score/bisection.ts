const MOST_STEPS = 200;

/**
 * Where a decreasing function passes zero, between two ends, to the last bit of a double.
 *
 * Gives the end when the function does not change sign inside: the function's zero then lies on or
 * beyond that end.
 */
export function zeroOfDecreasing(
  valueAt: (x: number) => number,
  lower: number,
  upper: number,
): number {
  let below = lower;
  let above = upper;
  for (let step = 0; step < MOST_STEPS; step += 1) {
    const middle = below + (above - below) / 2;
    if (middle === below || middle === above) {
      break;
    }
    if (valueAt(middle) > 0) {
      below = middle;
    } else {
      above = middle;
    }
  }
  return below === lower ? lower : above;
}
