/** Weights of a run of whole numbers from `first` on, the largest of them 1. */
export interface WeightRun {
  readonly first: number;
  readonly weights: Float64Array;
}

/** Weights below this share of the largest, 15 standard errors away, are cut off. */
const SMALLEST = 1e-50;

/** The logarithm of the largest weight that can have been cut off. */
export const LOG_OF_CUT = Math.log(SMALLEST);

/**
 * The weights of counts whose neighbours stand in a falling ratio, walked outwards from the mode.
 *
 * `ratioUp` gives the weight of count + 1 over that of count, for counts from `smallest` to below
 * `largest`. No logarithms, and no walk through the far tails of a large support.
 */
export function runAroundMode(
  { smallest, largest }: { readonly smallest: number; readonly largest: number },
  ratioUp: (count: number) => number,
): WeightRun {
  const mode = modeOf(smallest, largest, ratioUp);
  const above = walk(largest - mode, (step) => ratioUp(mode + step));
  const below = walk(mode - smallest, (step) => 1 / ratioUp(mode - step - 1));
  return {
    first: mode - below.length,
    weights: Float64Array.from([...below.reverse(), 1, ...above]),
  };
}

/** The first count whose successor is not likelier. */
function modeOf(smallest: number, largest: number, ratioUp: (count: number) => number): number {
  let low = smallest;
  let high = largest;
  while (low < high) {
    const middle = Math.floor((low + high) / 2);
    if (ratioUp(middle) > 1) {
      low = middle + 1;
    } else {
      high = middle;
    }
  }
  return low;
}

function walk(steps: number, ratioOf: (step: number) => number): number[] {
  const weights: number[] = [];
  let weight = 1;
  for (let step = 0; step < steps; step += 1) {
    weight *= ratioOf(step);
    if (weight < SMALLEST) {
      break;
    }
    weights.push(weight);
  }
  return weights;
}

/**
 * The run of the sum of independent counts, scaled and cut as every run. Halves are summed apart,
 * which multiplies runs of like length: half the work of adding one after another.
 */
export function sumOfRuns(runs: readonly WeightRun[]): WeightRun {
  const [first] = runs;
  if (first === undefined || runs.length === 1) {
    return first ?? { first: 0, weights: Float64Array.of(1) };
  }
  const half = runs.length >> 1;
  return sumOfTwo(sumOfRuns(runs.slice(0, half)), sumOfRuns(runs.slice(half)));
}

function sumOfTwo(one: WeightRun, other: WeightRun): WeightRun {
  const isShorter = one.weights.length < other.weights.length;
  const [shorter, longer] = isShorter ? [one, other] : [other, one];
  const sums = new Float64Array(shorter.weights.length + longer.weights.length - 1);
  for (let place = 0; place < shorter.weights.length; place += 1) {
    addMultiple(sums.subarray(place), longer.weights, shorter.weights[place] as number);
  }
  return cutEnds({ first: one.first + other.first, weights: sums });
}

function addMultiple(sums: Float64Array, weights: Float64Array, times: number): void {
  for (let place = 0; place < weights.length; place += 1) {
    sums[place] = (sums[place] as number) + times * (weights[place] as number);
  }
}

function cutEnds({ first, weights }: WeightRun): WeightRun {
  const largest = largestOf(weights);
  const least = SMALLEST * largest;
  let start = 0;
  while ((weights[start] as number) < least) start += 1;
  let end = weights.length;
  while ((weights[end - 1] as number) < least) end -= 1;
  const kept = weights.slice(start, end);
  for (let place = 0; place < kept.length; place += 1) {
    kept[place] = (kept[place] as number) / largest;
  }
  return { first: first + start, weights: kept };
}

function largestOf(weights: Float64Array): number {
  let largest = 0;
  for (const weight of weights) {
    largest = weight > largest ? weight : largest;
  }
  return largest;
}
