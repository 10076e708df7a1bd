import {
  ODDS_RATIO_INTERVALS,
  RISK_DIFFERENCE_INTERVALS,
  RISK_INTERVALS,
  RISK_RATIO_INTERVALS,
} from '#shared/stats';
import type { FourfoldTable, GroupCount, IntervalMethod } from '#shared/stats';

/** Group sizes of the compared designs; two groups are of equal size. */
export const SIZES = [10, 20, 50] as const;

const LEVEL = 0.95;

/** True risks of one group: 0.02, 0.03 … 0.5. */
const SINGLE_RISKS = Array.from({ length: 49 }, (_, step) => (step + 2) / 100);

/** True risks of two groups; all pairs of them are looked at, the larger in the index group. */
const PAIRED_RISKS = [0.02, 0.05, 0.1, 0.2, 0.3, 0.4, 0.5];

/** How a method does over the risks of a design, at the level 0.95. */
export interface Coverage {
  /** Mean and least probability, over the true risks, that the limits hold the true value. */
  readonly mean: number;
  readonly least: number;
  /** Mean width: of shares and differences as they are, of ratios as a factor, upper by lower. */
  readonly width: number;
  /** Mean probability of counts for which the method gives no limits at all. */
  readonly without: number;
}

/** An estimand with its methods, and how to look at one of them. */
export interface ComparedEstimand {
  readonly title: string;
  readonly isRatio: boolean;
  readonly methods: readonly Pick<IntervalMethod<unknown>, 'id' | 'label' | 'effort'>[];
  coverageOf(methodId: string, size: number): Coverage;
}

/** The estimands of one and of two groups. */
export const COMPARED: readonly ComparedEstimand[] = [
  {
    title: 'Risk of one group',
    isRatio: false,
    methods: Object.values(RISK_INTERVALS),
    coverageOf: (id, size) => coverageOfRisk(memberOf(RISK_INTERVALS, id), size),
  },
  twoGroups('Risk difference', RISK_DIFFERENCE_INTERVALS, false, (p, q) => p - q),
  twoGroups('Risk ratio', RISK_RATIO_INTERVALS, true, (p, q) => p / q),
  twoGroups('Odds ratio', ODDS_RATIO_INTERVALS, true, (p, q) => p / (1 - p) / (q / (1 - q))),
];

function twoGroups(
  title: string,
  register: Readonly<Record<string, IntervalMethod<FourfoldTable>>>,
  isRatio: boolean,
  truthOf: (indexRisk: number, referenceRisk: number) => number,
): ComparedEstimand {
  return {
    title,
    isRatio,
    methods: Object.values(register),
    coverageOf: (id, size) => coverageOfPairs(memberOf(register, id), size, isRatio, truthOf),
  };
}

function memberOf<Member>(register: Readonly<Record<string, Member>>, id: string): Member {
  const member = register[id];
  if (!member) {
    throw new Error(`No method ${id}`);
  }
  return member;
}

/** Limits of counts: none, or from one on upwards where the other is infinite. */
type Range = readonly [lower: number, upper: number] | null;

function coverageOfRisk(method: IntervalMethod<GroupCount>, size: number): Coverage {
  const ranges = counts(size).map((events) => rangeOf(method, { events, total: size }));
  return summary(
    SINGLE_RISKS.map((risk) => {
      const weights = binomial(size, risk);
      return judged(ranges, (at) => weights[at] ?? 0, risk, false);
    }),
  );
}

function coverageOfPairs(
  method: IntervalMethod<FourfoldTable>,
  size: number,
  isRatio: boolean,
  truthOf: (indexRisk: number, referenceRisk: number) => number,
): Coverage {
  const ranges = counts(size).flatMap((indexEvents) =>
    counts(size).map((referenceEvents) =>
      rangeOf(method, {
        index: { events: indexEvents, total: size },
        reference: { events: referenceEvents, total: size },
      }),
    ),
  );
  const width = size + 1;
  const pairs = PAIRED_RISKS.flatMap((p) => PAIRED_RISKS.filter((q) => q <= p).map((q) => [p, q]));
  return summary(
    pairs.map(([p = NaN, q = NaN]) => {
      const [rows, columns] = [binomial(size, p), binomial(size, q)];
      const weightOf = (at: number): number =>
        (rows[Math.floor(at / width)] ?? 0) * (columns[at % width] ?? 0);
      return judged(ranges, weightOf, truthOf(p, q), isRatio);
    }),
  );
}

function counts(size: number): readonly number[] {
  return Array.from({ length: size + 1 }, (_, count) => count);
}

function rangeOf<Counts>(method: IntervalMethod<Counts>, of: Counts): Range {
  const result = method.interval(of, LEVEL);
  if (result.ok) {
    return [result.value.lower, result.value.upper];
  }
  const atLeast = result.issue.facts?.atLeast;
  return typeof atLeast === 'number' ? [atLeast, Infinity] : null;
}

/** Limits are searched to 1e-10; a true value this near one is on it. */
const ON_A_LIMIT = 1e-9;

/** Probabilities at one truth: of limits that hold it, of no limits, and the mean width. */
function judged(
  ranges: readonly Range[],
  weightOf: (at: number) => number,
  truth: number,
  isRatio: boolean,
): Coverage {
  const sums = { held: 0, without: 0, widths: 0, finite: 0 };
  ranges.forEach((range, at) => {
    const weight = weightOf(at);
    if (range === null) {
      sums.without += weight;
      return;
    }
    const [lower, upper] = range;
    const slack = ON_A_LIMIT * Math.max(1, truth);
    sums.held += lower <= truth + slack && truth <= upper + slack ? weight : 0;
    const width = isRatio ? Math.log(upper / lower) : upper - lower;
    if (Number.isFinite(width)) {
      sums.widths += weight * width;
      sums.finite += weight;
    }
  });
  const held = sums.held / (1 - sums.without);
  return { mean: held, least: held, width: sums.widths / sums.finite, without: sums.without };
}

function summary(each: readonly Coverage[]): Coverage {
  const mean = (part: (one: Coverage) => number): number =>
    each.reduce((sum, one) => sum + part(one), 0) / each.length;
  return {
    mean: mean((one) => one.mean),
    least: Math.min(...each.map((one) => one.least)),
    width: mean((one) => one.width),
    without: mean((one) => one.without),
  };
}

/** Binomial probabilities of 0 … size events, by ratios of neighbours. */
function binomial(size: number, risk: number): readonly number[] {
  const terms = [(1 - risk) ** size];
  for (let count = 0; count < size; count += 1) {
    const ratio = ((size - count) / (count + 1)) * (risk / (1 - risk));
    terms.push((terms[count] ?? 0) * ratio);
  }
  return terms;
}
