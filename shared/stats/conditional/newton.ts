/** The range of a search on the log scale; e^60 is far beyond any ratio of counts. */
export const RANGE = [-60, 60] as const;

/** A function's value and slope at a place. */
export interface ValueAndSlope {
  readonly value: number;
  readonly slope: number;
}

/** More steps than bisection from end to end would take. */
const MOST_STEPS = 100;

/** After a step this small the error is of the order of its square. */
const SETTLED = 1e-8;

/**
 * The zero of an increasing function between two ends, by Newton steps from a start; a step that
 * would leave what is known to hold the zero, or of no finite size, is a bisection instead.
 */
export function zeroOfIncreasing(
  at: (x: number) => ValueAndSlope,
  start: number,
  [least, most]: readonly [number, number],
): number {
  let [lower, upper] = [least, most];
  let x = Math.min(most, Math.max(least, start));
  for (let step = 0; step < MOST_STEPS; step += 1) {
    const { value, slope } = at(x);
    if (value > 0) {
      upper = x;
    } else {
      lower = x;
    }
    const newton = x - value / slope;
    const next = newton >= lower && newton <= upper ? newton : (lower + upper) / 2;
    const settled = Math.abs(next - x) <= SETTLED * Math.max(1, Math.abs(x));
    x = next;
    if (settled) {
      break;
    }
  }
  return x;
}
