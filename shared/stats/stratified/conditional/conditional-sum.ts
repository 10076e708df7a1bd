import { marginsOf } from '../../check-counts';
import { hypergeometricSupport } from '../../distributions';
import type { Urn } from '../../distributions';
import { fitOddsRatio } from '../../fitted-odds-ratio';
import type { FourfoldTable, StratifiedTable } from '../../fourfold-table';
import { zeroOfDecreasing } from '../../intervals/score/bisection';
import type { WeightRun } from './weight-run';
import { runAroundMode, sumOfRuns } from './weight-run';

/** Half the width of a search on the log scale; e^60 is far beyond any ratio of counts. */
export const FARTHEST = 60;

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

/** Probabilities of fewer events than observed, as many and more, with the mean, at some ratio. */
export interface ConditionalTails {
  readonly below: number;
  readonly at: number;
  readonly above: number;
  readonly mean: number;
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
): (logRatio: number) => ConditionalTails {
  const start = startingRatio(strata, support);
  const run = sumOfRuns(strata.map(({ table }) => noncentralRun(urnOf(table), Math.exp(start))));
  const logWeights = run.weights.map((weight) => Math.log(weight));
  return (logRatio) => tailsOf(run.first, logWeights, logRatio - start, support.observed);
}

/** About where the expected events are the observed ones, half an event inside the support. */
function startingRatio(strata: StratifiedTable, support: ConditionalSupport): number {
  const { observed, smallest, largest } = support;
  const inside = Math.min(largest - 0.5, Math.max(smallest + 0.5, observed));
  return zeroOfDecreasing(
    (logRatio) =>
      strata.reduce((sum, { table }) => sum + fitOddsRatio(table, logRatio).deviation, 0) +
      (inside - observed),
    -FARTHEST,
    FARTHEST,
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

function tailsOf(
  first: number,
  logWeights: Float64Array,
  tilt: number,
  observed: number,
): ConditionalTails {
  const largest = logWeights.reduce((most, log, place) => Math.max(most, log + place * tilt), -1e9);
  const sums = { below: 0, at: 0, above: 0, moment: 0 };
  for (let place = 0; place < logWeights.length; place += 1) {
    const weight = Math.exp((logWeights[place] as number) + place * tilt - largest);
    const side = sideOf(first + place, observed);
    sums[side] += weight;
    sums.moment += weight * place;
  }
  const total = sums.below + sums.at + sums.above;
  return {
    below: sums.below / total,
    at: sums.at / total,
    above: sums.above / total,
    mean: first + sums.moment / total,
  };
}

function sideOf(count: number, observed: number): 'below' | 'at' | 'above' {
  if (count === observed) {
    return 'at';
  }
  return count < observed ? 'below' : 'above';
}
