import type { FourfoldTable } from '../../fourfold-table';
import { riskDifferenceOf } from '../../point-estimates';
import type { Limits } from '../interval-method';
import { zeroOfDecreasing } from './bisection';

/** Every difference that the score statistic does not refuse, as an interval within [-1, 1]. */
export function limitsOfDifference(
  table: FourfoldTable,
  score: (difference: number) => number,
  z: number,
): Limits {
  const difference = riskDifferenceOf(table);
  return [
    zeroOfDecreasing((tested) => score(tested) - z, -1, difference),
    zeroOfDecreasing((tested) => score(tested) + z, difference, 1),
  ];
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
  const lower = (): number => zeroOfDecreasing((tested) => score(tested) - z, -FARTHEST, start);
  const upper = (): number => zeroOfDecreasing((tested) => score(tested) + z, start, FARTHEST);
  return [ratio === 0 ? 0 : Math.exp(lower()), ratio === Infinity ? ratio : Math.exp(upper())];
}
