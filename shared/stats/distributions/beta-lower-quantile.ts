import { deviance, stirlingError } from './hypergeometric';
import { normalQuantile } from './normal';

/** Sizes up to which the continued fraction takes few terms. */
const LARGEST_SUM = 4000;

/** A step this small, in standard deviations, leaves an error of about its cube. */
const SETTLED = 1e-6;

const MOST_STEPS = 8;
const MOST_TERMS = 300;

/**
 * The x of a beta distribution with P(X <= x) = tail, for a tail of at most one half and shapes of
 * at least 1; NaN where a few steps do not find it, or for shapes whose sum is large.
 *
 * Halley's steps from an approximation by a normal quantile, mostly two of them.
 * Source of the start: Carter (1947) Biometrika 34:352-358.
 */
export function betaLowerQuantile(tail: number, a: number, b: number): number {
  if (!(a >= 1 && b >= 1 && a + b <= LARGEST_SUM)) {
    return NaN;
  }
  const spread = Math.sqrt((a * b) / (a + b + 1)) / (a + b);
  const factor = frontFactor(a, b);
  let x = roughQuantile(tail, a, b);
  for (let step = 0; step < MOST_STEPS && x > 0 && x < 1; step += 1) {
    const front = factor * shareOfPeak(x, a, b);
    const excess = (front * continuedFraction(x, a, b)) / a - tail;
    const newton = (excess * x * (1 - x)) / front;
    const bend = (a - 1) / x - (b - 1) / (1 - x);
    const shift = newton / (1 - Math.min(1, newton * bend) / 2);
    x -= shift;
    if (Math.abs(shift) <= SETTLED * Math.min(spread, x)) {
      return x;
    }
  }
  return NaN;
}

/** Good to about three digits. */
function roughQuantile(tail: number, a: number, b: number): number {
  const z = -normalQuantile(tail);
  const [one, other] = [1 / (2 * a - 1), 1 / (2 * b - 1)];
  const size = 2 / (one + other);
  const bend = (z * z - 3) / 6;
  const skew = (other - one) * (bend + 5 / 6 - 2 / (3 * size));
  const half = (z * Math.sqrt(Math.max(0, size + bend))) / size - skew;
  return a / (a + b * Math.exp(2 * half));
}

/** x^a (1 - x)^b over the beta function, at x = a / (a + b) where it is largest. */
function frontFactor(a: number, b: number): number {
  const sum = a + b;
  const errors = stirlingError(sum) - stirlingError(a) - stirlingError(b);
  return Math.exp(errors) * Math.sqrt((a * b) / (2 * Math.PI * sum));
}

/** x^a (1 - x)^b as a share of its largest value. */
function shareOfPeak(x: number, a: number, b: number): number {
  const sum = a + b;
  return Math.exp(-deviance(a, sum * x) - deviance(b, sum * (1 - x)));
}

/** Lentz's evaluation of the continued fraction of the incomplete beta function. */
function continuedFraction(x: number, a: number, b: number): number {
  let top = 1;
  let inverse = 1 / (1 - ((a + b) * x) / (a + 1));
  let product = inverse;
  for (let place = 1; place < MOST_TERMS; place += 1) {
    const even = (place * (b - place) * x) / ((a + 2 * place - 1) * (a + 2 * place));
    inverse = 1 / (1 + even * inverse);
    top = 1 + even / top;
    product *= top * inverse;
    const odd = -((a + place) * (a + b + place) * x) / ((a + 2 * place) * (a + 2 * place + 1));
    inverse = 1 / (1 + odd * inverse);
    top = 1 + odd / top;
    const change = top * inverse;
    product *= change;
    if (Math.abs(change - 1) < Number.EPSILON) {
      return product;
    }
  }
  return NaN;
}
