import gammainc from '@stdlib/math-base-special-gammainc';

const MOST_STEPS = 400;

/**
 * Gamma quantile of scale 1: the x with P(X <= x) = p, for a shape >= 1 and 0 < p < 1.
 *
 * Half the chi-square quantile of twice the shape in degrees of freedom. Good to 1e-11 relative.
 * Source: inverse of the regularised incomplete gamma function, by bisection.
 */
export function gammaQuantile(probability: number, shape: number): number {
  return bisect(shape, (x) => gammainc(x, shape, true, false) < probability);
}

/** The x of a gamma distribution of scale 1 that leaves a probability above it: P(X > x) = tail. */
export function gammaUpperQuantile(tail: number, shape: number): number {
  return bisect(shape, (x) => gammainc(x, shape, true, true) > tail);
}

/** Where a statement that holds for small x only stops to hold. */
function bisect(shape: number, holds: (x: number) => boolean): number {
  let below = 0;
  let above = shape;
  while (holds(above)) {
    below = above;
    above *= 2;
  }
  for (let step = 0; step < MOST_STEPS; step += 1) {
    const middle = below + (above - below) / 2;
    if (middle === below || middle === above) {
      break;
    }
    if (holds(middle)) {
      below = middle;
    } else {
      above = middle;
    }
  }
  return above;
}
