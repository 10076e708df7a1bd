import { deviance } from './hypergeometric';
import { logGamma } from './log-gamma';

const MOST_STEPS = 400;
const MOST_TERMS = 1_000_000;
const STIRLING_FROM = 32;

/**
 * Gamma quantile of scale 1: the x with P(X <= x) = p, for a shape >= 1 and 0 < p < 1.
 *
 * Half the chi-square quantile of twice the shape in degrees of freedom. Good to 1e-11 relative.
 * Source: inverse of the regularised incomplete gamma function, by bisection.
 */
export function gammaQuantile(probability: number, shape: number): number {
  return bisect(shape, (x) => tailsOf(x, shape).lower < probability);
}

/** The x of a gamma distribution of scale 1 that leaves a probability above it: P(X > x) = tail. */
export function gammaUpperQuantile(tail: number, shape: number): number {
  return bisect(shape, (x) => tailsOf(x, shape).upper > tail);
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

/**
 * Both tails of a gamma distribution of scale 1: by the power series below the shape, by the
 * continued fraction above it, each in some multiples of the shape's square root of terms. (The
 * expansion for large shapes in stdlib's incomplete gamma is off in the third digit.)
 */
function tailsOf(x: number, shape: number): { readonly lower: number; readonly upper: number } {
  if (x <= 0) {
    return { lower: 0, upper: 1 };
  }
  const front = frontFactor(x, shape);
  if (x < shape + 1) {
    const lower = Math.min(1, front * powerSeries(x, shape));
    return { lower, upper: 1 - lower };
  }
  const upper = Math.min(1, front * continuedFraction(x, shape) * shape);
  return { lower: 1 - upper, upper };
}

/** x^shape e^-x / Gamma(shape + 1). */
function frontFactor(x: number, shape: number): number {
  if (shape < STIRLING_FROM) {
    return Math.exp(shape * Math.log(x) - x - logGamma(shape + 1));
  }
  const square = shape * shape;
  const stirling = (1 / 12 - (1 / 360 - (1 / 1260 - 1 / 1680 / square) / square) / square) / shape;
  return Math.exp(-stirling - deviance(shape, x)) / Math.sqrt(2 * Math.PI * shape);
}

function powerSeries(x: number, shape: number): number {
  let term = 1;
  let sum = 1;
  for (let place = 1; place < MOST_TERMS && term > sum * Number.EPSILON; place += 1) {
    term *= x / (shape + place);
    sum += term;
  }
  return sum;
}

/** Lentz's evaluation of the continued fraction of the upper incomplete gamma function. */
function continuedFraction(x: number, shape: number): number {
  let bottom = x + 1 - shape;
  let top = 1 / Number.MIN_VALUE ** 0.5;
  let inverse = 1 / bottom;
  let product = inverse;
  for (let place = 1; place < MOST_TERMS; place += 1) {
    const numerator = -place * (place - shape);
    bottom += 2;
    inverse = 1 / (numerator * inverse + bottom);
    top = bottom + numerator / top;
    const factor = inverse * top;
    product *= factor;
    if (Math.abs(factor - 1) < Number.EPSILON) {
      break;
    }
  }
  return product;
}
