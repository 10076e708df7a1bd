import { marginsOf } from '../../check-counts';
import { hypergeometricSupport } from '../../distributions';
import type { Urn } from '../../distributions';
import type { FourfoldTable, StratifiedTable } from '../../fourfold-table';
import { zeroOfIncreasing } from '../../conditional/newton';
import type { WeightRun } from './weight-run';
import { LOG_OF_CUT, runAroundMode, sumOfRuns } from './weight-run';

/** The range of a search on the log scale; e^60 is far beyond any ratio of counts. */
export const RANGE = [-60, 60] as const;

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

function urnOf(table: FourfoldTable): Urn {
  return {
    marked: table.index.total,
    unmarked: table.reference.total,
    drawn: marginsOf(table).events,
  };
}

/** Probabilities of fewer events than observed, as many and more, at some ratio, with moments. */
export interface ConditionalTails {
  readonly below: number;
  readonly at: number;
  readonly above: number;
  /** Sums of probability times distance from the observed number, on either side. */
  readonly momentBelow: number;
  readonly momentAbove: number;
  readonly variance: number;
}

/** The distribution of the index groups' events by the logarithm of the common odds ratio. */
export interface ConditionalSum {
  readonly tailsAt: (logRatio: number) => ConditionalTails;
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
function tailsOf(first: number, logWeights: Float64Array, tilt: number): ConditionalTails {
  const heaviest = largestTilted(logWeights, tilt);
  const sums = { below: 0, at: 0, above: 0, momentBelow: 0, momentAbove: 0, squares: 0 };
  for (let place = 0; place < logWeights.length; place += 1) {
    const weight = Math.exp((logWeights[place] as number) + place * tilt - heaviest);
    const distance = first + place;
    sums.squares += weight * distance * distance;
    if (distance < 0) {
      sums.below += weight;
      sums.momentBelow += weight * distance;
    } else if (distance > 0) {
      sums.above += weight;
      sums.momentAbove += weight * distance;
    } else {
      sums.at = weight;
    }
  }
  const total = sums.below + sums.at + sums.above;
  const mean = (sums.momentBelow + sums.momentAbove) / total;
  return {
    below: sums.below / total,
    at: sums.at / total,
    above: sums.above / total,
    momentBelow: sums.momentBelow / total,
    momentAbove: sums.momentAbove / total,
    variance: sums.squares / total - mean * mean,
  };
}

function largestTilted(logWeights: Float64Array, tilt: number): number {
  let largest = -Infinity;
  for (let place = 0; place < logWeights.length; place += 1) {
    largest = Math.max(largest, (logWeights[place] as number) + place * tilt);
  }
  return largest;
}
