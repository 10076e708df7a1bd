/** A labelled place on an axis. */
export interface AxisTick {
  readonly value: number;
  readonly at: number;
}

/** A drawn axis: where a value lies, 0 at its left end and 1 at its right, and its ticks. */
export interface IntervalAxis {
  readonly ticks: readonly AxisTick[];
  /** Where a value lies, 0..1; values beyond an end lie on it. */
  readonly at: (value: number) => number;
}

const STEP_FACTORS = [1, 2, 2.5, 5, 10];
const MOST_STEPS = 7;

/**
 * An axis of equal steps that holds every value and zero, with round ticks. For differences in
 * percentage points.
 */
export function linearAxis(values: readonly number[]): IntervalAxis {
  const lowest = Math.min(0, ...values);
  const highest = Math.max(0, ...values);
  const step = roundStep((highest - lowest || 1) / (MOST_STEPS - 1));
  const first = Math.floor(lowest / step + 1e-9);
  const last = Math.max(first + 1, Math.ceil(highest / step - 1e-9));
  const ticks = Array.from({ length: last - first + 1 }, (_, index) => (first + index) * step);
  return axisOf(ticks, (value) => value);
}

/**
 * An axis of equal factors that holds every value and one, with round ticks. For ratios; values
 * are greater than zero.
 */
export function logarithmicAxis(values: readonly number[]): IntervalAxis {
  const lowest = Math.min(1, ...values);
  const highest = Math.max(1, ...values);
  const ladder = ladderFor(highest / lowest);
  const first = lastIndexAtMost(ladder, lowest);
  const last = ladder.findIndex((value) => value >= highest * (1 - 1e-9));
  return axisOf(ladder.slice(first, Math.max(first + 1, last) + 1), Math.log);
}

function roundStep(least: number): number {
  const power = 10 ** Math.floor(Math.log10(least));
  const factor = STEP_FACTORS.find((each) => each * power >= least * (1 - 1e-9)) ?? 10;
  return factor * power;
}

/** Round values from far below to far above one; fewer of them where the span is wide. */
function ladderFor(span: number): readonly number[] {
  const factors = span <= 4 ? [1, 1.5, 2, 3, 5, 7] : span <= 60 ? [1, 2, 5] : [1];
  const powers = Array.from({ length: 25 }, (_, index) => index - 12);
  return powers.flatMap((power) => factors.map((factor) => Number(`${factor}e${power}`)));
}

function lastIndexAtMost(ladder: readonly number[], value: number): number {
  return Math.max(
    0,
    ladder.findLastIndex((each) => each <= value * (1 + 1e-9)),
  );
}

function axisOf(ticks: readonly number[], scale: (value: number) => number): IntervalAxis {
  const start = scale(ticks[0] ?? 0);
  const end = scale(ticks.at(-1) ?? 1);
  const at = (value: number): number =>
    Math.min(1, Math.max(0, (scale(value) - start) / (end - start)));
  return { at, ticks: ticks.map((value) => ({ value, at: at(value) })) };
}
