import type { FourfoldTable } from '../../fourfold-table';
import { riskDifferenceOf } from '../../point-estimates';
import type { Limits } from '../interval-method';
import { zeroOfDecreasingFrom } from './bisection';

/** Every difference that the score statistic does not refuse, as an interval within [-1, 1]. */
export function limitsOfDifference(
  table: FourfoldTable,
  score: (difference: number) => number,
  z: number,
): Limits {
  const difference = riskDifferenceOf(table);
  return [limitTowards(-1, difference, score, z), limitTowards(1, difference, score, z)];
}

/** Half the width of the search on the log scale; e^60 is far beyond any ratio of counts. */
const FARTHEST = 60;

/**
 * Every ratio that the score statistic does not refuse, sought on the log scale. The score takes
 * the logarithm of the tested ratio and is decreasing in it; a ratio of 0 has the lower limit 0, an
 * infinite one the upper limit infinity.
 */
export function limitsOfRatio(
  ratio: number,
  score: (logRatio: number) => number,
  z: number,
): Limits {
  const start = Math.max(-FARTHEST, Math.min(FARTHEST, Math.log(ratio)));
  const limit = (end: number): number => Math.exp(limitTowards(end, start, score, z));
  return [ratio === 0 ? 0 : limit(-FARTHEST), ratio === Infinity ? ratio : limit(FARTHEST)];
}

/** How far the first look goes: near a usual limit of a difference, and on the log scale. */
const FIRST_WIDTH = 0.25;

/** The value towards an end where the score, seen from a start within the interval, reaches z. */
function limitTowards(
  end: number,
  start: number,
  score: (tested: number) => number,
  z: number,
): number {
  const critical = end > start ? -z : z;
  const valueAt = (tested: number): number => score(tested) - critical;
  return zeroOfDecreasingFrom(valueAt, { x: start, value: valueAt(start) }, end, FIRST_WIDTH);
}
