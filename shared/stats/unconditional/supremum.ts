/** A probability along the nuisance parameter, which is brought to 0 … 1. */
export type NuisanceCurve = (place: number) => number;

/** The parabola through three places of the grid may fall short of a peak by this part. */
const SHORTFALL = 0.01;

/** Parabolic steps per peak; each gains more than a digit. */
const MOST_STEPS = 12;

/** How many places of the nuisance parameter are looked at for groups of these sizes. */
export function gridSize(largestGroup: number): number {
  return Math.max(32, Math.ceil(6 * Math.sqrt(largestGroup)));
}

/**
 * The largest value of a curve over 0 … 1: the highest places of an even grid, refined.
 *
 * The grid's step is half a standard error of a share on the arcsine scale, on which sums of
 * binomial probabilities have no narrower features.
 */
export function supremumOf(curve: NuisanceCurve, size: number): number {
  const values = Float64Array.from({ length: size + 1 }, (_, place) => curve(place / size));
  const highest = Math.max(...values);
  return peaksOf(values, highest).reduce(
    (largest, place) => Math.max(largest, refine(curve, values, place)),
    highest,
  );
}

/** How far apart the first look goes over the grid. */
const STRIDE = 4;

/** A curve this far below a threshold at every STRIDE-th place, 2 standard errors, stays below. */
const FAR_BELOW = 1e-6;

/**
 * Where a curve passes a threshold, or null; mostly fewer looks than the supremum would take, above
 * all with a hint where it may.
 */
export function placeAbove(
  curve: NuisanceCurve,
  size: number,
  threshold: number,
  hint: number,
): number | null {
  if (curve(hint) > threshold) {
    return hint;
  }
  const values = new Float64Array(size + 1);
  for (let start = 0; start < STRIDE; start += 1) {
    for (let place = start; place <= size; place += STRIDE) {
      values[place] = curve(place / size);
      if ((values[place] as number) > threshold) {
        return place / size;
      }
    }
    if (start === 0 && values.every((value) => value < FAR_BELOW * threshold)) {
      return null;
    }
  }
  const peak = peaksOf(values, threshold).find(
    (place) => refine(curve, values, place, threshold) > threshold,
  );
  return peak === undefined ? null : peak / size;
}

/** The places no lower than their neighbours around which the curve may reach a height. */
function peaksOf(values: ArrayLike<number>, height: number): readonly number[] {
  const places: number[] = [];
  for (let place = 1; place < values.length - 1; place += 1) {
    const before = values[place - 1] as number;
    const here = values[place] as number;
    const after = values[place + 1] as number;
    const isPeak = here > 0 && here >= before && here >= after;
    if (isPeak && topOf(before, here, after) * (1 + SHORTFALL) >= height) {
      places.push(place);
    }
  }
  return places;
}

/** Height of the parabola through three evenly spaced values, the middle one the highest. */
function topOf(before: number, here: number, after: number): number {
  const bend = 2 * here - before - after;
  return bend > 0 ? here + (after - before) ** 2 / (8 * bend) : here;
}

/** The height of the peak around a place of the grid; stops early beyond `enough`. */
function refine(
  curve: NuisanceCurve,
  values: ArrayLike<number>,
  place: number,
  enough = Infinity,
): number {
  const size = values.length - 1;
  let left = { x: (place - 1) / size, y: values[place - 1] ?? 0 };
  let middle = { x: place / size, y: values[place] ?? 0 };
  let right = { x: (place + 1) / size, y: values[place + 1] ?? 0 };
  for (let step = 0; step < MOST_STEPS && middle.y <= enough; step += 1) {
    const x = vertexOf(left, middle, right);
    const next = { x, y: curve(x) };
    const gain = Math.abs(next.y - middle.y);
    const [lower, higher] = next.y > middle.y ? [middle, next] : [next, middle];
    left = lower.x < higher.x ? lower : left;
    right = lower.x > higher.x ? lower : right;
    middle = higher;
    if (gain <= 1e-14 * middle.y) {
      break;
    }
  }
  return middle.y;
}

interface Point {
  readonly x: number;
  readonly y: number;
}

/** Top of the parabola through three points, or a step into the wider half where it is flat. */
function vertexOf(left: Point, middle: Point, right: Point): number {
  const [before, after] = [middle.x - left.x, right.x - middle.x];
  const [fall, rise] = [(middle.y - left.y) * after, (middle.y - right.y) * before];
  const shift = (fall * after - rise * before) / (2 * (fall + rise));
  const wider = after > before ? middle.x + 0.4 * after : middle.x - 0.4 * before;
  const x = middle.x + shift;
  const inside = x > left.x && x < right.x && x !== middle.x;
  return inside ? x : wider;
}
