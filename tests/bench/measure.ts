import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';

/** Wall times of repeated runs, in milliseconds. */
export interface Timing {
  readonly median: number;
  /** Three quarters of the runs take at most this. */
  readonly upperQuartile: number;
  readonly lowest: number;
  readonly highest: number;
  readonly runs: number;
}

/** One line of the table of results. */
export interface Measured {
  readonly what: string;
  readonly budgetInMilliseconds: number;
  readonly timing: Timing;
  /** What the machine needs for comparable work, measured in the same run; null without one. */
  readonly floor: { readonly what: string; readonly timing: Timing } | null;
}

/** Runs work again and again, the first runs uncounted, each on what `prepare` gives. */
export function timed<Input>(
  prepare: (run: number) => Input,
  work: (input: Input) => unknown,
  { runs = 15, warmUps = 5 }: { readonly runs?: number; readonly warmUps?: number } = {},
): Timing {
  const times = Array.from({ length: runs + warmUps }, (_, run) => {
    const input = prepare(run);
    const start = performance.now();
    work(input);
    return performance.now() - start;
  });
  return timingOf(times.slice(warmUps));
}

/** The same for work that is waited for. */
export async function timedWait(
  work: () => Promise<unknown>,
  { runs = 7, warmUps = 2 }: { readonly runs?: number; readonly warmUps?: number } = {},
): Promise<Timing> {
  const times: number[] = [];
  for (let run = 0; run < runs + warmUps; run += 1) {
    const start = performance.now();
    await work();
    if (run >= warmUps) times.push(performance.now() - start);
  }
  return timingOf(times);
}

/** Sums up the times of runs. */
export function timingOf(times: readonly number[]): Timing {
  const sorted = times.toSorted((one, other) => one - other);
  const at = (share: number): number => sorted[Math.floor(share * (sorted.length - 1))] ?? 0;
  return {
    median: at(0.5),
    upperQuartile: at(0.75),
    lowest: at(0),
    highest: at(1),
    runs: times.length,
  };
}

const FILE = 'coverage/bench.json';

/** Prints a result, and adds it to `coverage/bench.json` in place of an earlier one. */
export function report(measured: Measured): void {
  const { what, budgetInMilliseconds, timing, floor } = measured;
  const times = floor === null ? 0 : timing.median / floor.timing.median;
  const ratio = floor === null ? '' : ` · ${times.toFixed(1)} × ${floor.what}`;
  const spread = `${timing.lowest.toFixed(1)} to ${timing.highest.toFixed(1)}`;
  const budget = `budget ${String(budgetInMilliseconds)}`;
  console.log(`${what}: ${timing.median.toFixed(1)} ms (${spread}; ${budget})${ratio}`);
  const others = earlier().filter((one) => one.what !== what);
  mkdirSync('coverage', { recursive: true });
  writeFileSync(FILE, `${JSON.stringify([...others, measured], null, 2)}\n`);
}

function earlier(): readonly Measured[] {
  try {
    return JSON.parse(readFileSync(FILE, 'utf8')) as readonly Measured[];
  } catch {
    return [];
  }
}
