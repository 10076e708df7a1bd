/** Weights of a run of whole numbers from `first` on, the largest of them 1. */
export interface WeightRun {
  readonly first: number;
  readonly weights: Float64Array;
}

/** Weights below this share of the largest are cut off; tails that matter are far above. */
const SMALLEST = 1e-150;

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

/** The run of the sum of two independent counts, scaled and cut as every run. */
export function sumOfRuns(one: WeightRun, other: WeightRun): WeightRun {
  const sums = new Float64Array(one.weights.length + other.weights.length - 1);
  one.weights.forEach((weight, place) => {
    addMultiple(sums, place, other.weights, weight);
  });
  return cutEnds({ first: one.first + other.first, weights: sums });
}

function addMultiple(sums: Float64Array, at: number, weights: Float64Array, times: number): void {
  for (let place = 0; place < weights.length; place += 1) {
    sums[at + place] = (sums[at + place] as number) + times * (weights[place] as number);
  }
}

function cutEnds({ first, weights }: WeightRun): WeightRun {
  const largest = weights.reduce((most, weight) => Math.max(most, weight), 0);
  const kept = (weight: number): boolean => weight >= SMALLEST * largest;
  const start = weights.findIndex(kept);
  const end = weights.findLastIndex(kept);
  return {
    first: first + start,
    weights: weights.slice(start, end + 1).map((weight) => weight / largest),
  };
}
