import { hypergeometricSupport } from '../../distributions';
import type { Urn } from '../../distributions';
import type { StratifiedTable } from '../../fourfold-table';
import { RANGE, zeroOfIncreasing } from '../../conditional/newton';
import { addTerm, emptySums, sharesOf } from '../../conditional/tail-sums';
import type { ConditionalCounts } from '../../conditional/tail-sums';
import { urnOf } from '../../urn-of';
import type { WeightRun } from './weight-run';
import { LOG_OF_CUT, runAroundMode, sumOfRuns } from './weight-run';

/** The events of the index groups over all strata, with what they could have been. */
export interface ConditionalSupport {
  readonly observed: number;
  readonly smallest: number;
  readonly largest: number;
}

/** The support of the index groups' events, all margins of all strata fixed. */
export function conditionalSupport(strata: StratifiedTable): ConditionalSupport {
  const supports = strata.map(({ table }) => hypergeometricSupport(urnOf(table)));
  return {
    observed: strata.reduce((sum, { table }) => sum + table.index.events, 0),
    smallest: supports.reduce((sum, { smallest }) => sum + smallest, 0),
    largest: supports.reduce((sum, { largest }) => sum + largest, 0),
  };
}

/** The distribution of the index groups' events by the logarithm of the common odds ratio. */
export interface ConditionalSum {
  readonly tailsAt: (logRatio: number) => ConditionalCounts;
  /** Whether the counts that were cut off at either end do not matter at a ratio. */
  readonly covers: (logRatio: number) => boolean;
}

/**
 * The distribution of the index groups' events given all margins, as a function of the logarithm of
 * the common odds ratio: noncentral hypergeometric counts of the strata, summed.
 *
 * The weights are laid out at a ratio, best near those that are asked for, and tilted from there:
 * counts that hardly occur at it are cut off, so that the distribution covers ratios around it.
 */
export function conditionalSum(
  strata: StratifiedTable,
  support: ConditionalSupport,
  start: number,
): ConditionalSum {
  const run = sumOfRuns(strata.map(({ table }) => noncentralRun(urnOf(table), Math.exp(start))));
  const logWeights = run.weights.map((weight) => Math.log(weight));
  const first = run.first - support.observed;
  return {
    tailsAt: (logRatio) => tailsOf(first, logWeights, logRatio - start),
    covers(logRatio) {
      const tilt = logRatio - start;
      const negligible = largestTilted(logWeights, tilt) - DIGITS - LOG_OF_CUT;
      return -tilt < negligible && logWeights.length * tilt < negligible;
    },
  };
}

/** The logarithm of what no double would notice in a sum. */
const DIGITS = 40;

/**
 * The logarithm of the ratio at which the expected events are the observed ones, kept half an event
 * inside the support: strata one by one, no sum laid out.
 */
export function startingRatio(strata: StratifiedTable, support: ConditionalSupport): number {
  const { observed, smallest, largest } = support;
  const inside = Math.min(largest - 0.5, Math.max(smallest + 0.5, observed));
  const urns = strata.map(({ table }) => urnOf(table));
  return zeroOfIncreasing(
    (logRatio) => {
      const moments = urns.map((urn) => momentsOf(noncentralRun(urn, Math.exp(logRatio))));
      const mean = moments.reduce((sum, one) => sum + one.mean, 0);
      return { value: mean - inside, slope: moments.reduce((sum, one) => sum + one.variance, 0) };
    },
    0,
    RANGE,
  );
}

function momentsOf({ first, weights }: WeightRun): { mean: number; variance: number } {
  const sums = { weight: 0, moment: 0, squares: 0 };
  for (let place = 0; place < weights.length; place += 1) {
    const weight = weights[place] as number;
    sums.weight += weight;
    sums.moment += weight * place;
    sums.squares += weight * place * place;
  }
  const mean = sums.moment / sums.weight;
  return { mean: first + mean, variance: sums.squares / sums.weight - mean * mean };
}

function noncentralRun(urn: Urn, ratio: number): WeightRun {
  const { marked, unmarked, drawn } = urn;
  return runAroundMode(
    hypergeometricSupport(urn),
    (count) =>
      ratio * ((marked - count) / (count + 1)) * ((drawn - count) / (unmarked - drawn + count + 1)),
  );
}

/** `first` is the distance of the first weight's count from the observed one. */
function tailsOf(first: number, logWeights: Float64Array, tilt: number): ConditionalCounts {
  const heaviest = largestTilted(logWeights, tilt);
  const sums = emptySums();
  for (let place = 0; place < logWeights.length; place += 1) {
    const weight = Math.exp((logWeights[place] as number) + place * tilt - heaviest);
    addTerm(sums, first + place, weight);
  }
  return sharesOf(sums);
}

function largestTilted(logWeights: Float64Array, tilt: number): number {
  let largest = -Infinity;
  for (let place = 0; place < logWeights.length; place += 1) {
    largest = Math.max(largest, (logWeights[place] as number) + place * tilt);
  }
  return largest;
}
