import { marginsOf } from '../../check-counts';
import { hypergeometricSupport } from '../../distributions';
import type { Urn } from '../../distributions';
import { fitOddsRatio } from '../../fitted-odds-ratio';
import type { FourfoldTable, StratifiedTable } from '../../fourfold-table';
import { zeroOfDecreasing } from '../../intervals/score/bisection';
import type { WeightRun } from './weight-run';
import { runAroundMode, sumOfRuns } from './weight-run';

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
  /** A ratio near the estimate. */
  readonly start: number;
  readonly tailsAt: (logRatio: number) => ConditionalTails;
}

/**
 * The distribution of the index groups' events given all margins, as a function of the logarithm of
 * the common odds ratio: noncentral hypergeometric counts of the strata, summed.
 *
 * The weights are laid out at a ratio near the estimate and tilted from there, so that nothing
 * near the observed number underflows however far the ratio is from 1.
 */
export function conditionalSum(
  strata: StratifiedTable,
  support: ConditionalSupport,
): ConditionalSum {
  const start = startingRatio(strata, support);
  const run = sumOfRuns(strata.map(({ table }) => noncentralRun(urnOf(table), Math.exp(start))));
  const logWeights = run.weights.map((weight) => Math.log(weight));
  const first = run.first - support.observed;
  return { start, tailsAt: (logRatio) => tailsOf(first, logWeights, logRatio - start) };
}

/** About where the expected events are the observed ones, half an event inside the support. */
function startingRatio(strata: StratifiedTable, support: ConditionalSupport): number {
  const { observed, smallest, largest } = support;
  const inside = Math.min(largest - 0.5, Math.max(smallest + 0.5, observed));
  return zeroOfDecreasing(
    (logRatio) =>
      strata.reduce((sum, { table }) => sum + fitOddsRatio(table, logRatio).deviation, 0) +
      (inside - observed),
    ...RANGE,
  );
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
