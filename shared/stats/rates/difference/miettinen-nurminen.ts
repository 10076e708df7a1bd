import { intervalMethod } from '../../intervals/interval-method';
import { MIETTINEN_NURMINEN } from '../../intervals/miettinen-nurminen-words';
import { zeroOfDecreasing } from '../../intervals/score/bisection';
import { issueOfRates, rateDifferenceOf } from '../rate-count';
import type { RateTable } from '../rate-count';

/**
 * Miettinen and Nurminen's score interval for a rate difference, index less reference.
 *
 * Takes events and person-time of two independent groups; gives events per unit of that time.
 * Defined for groups without events, both included; no person-time gives `emptyGroup`.
 *
 * Source: Miettinen and Nurminen (1985) Statistics in Medicine 4:213-226, rates.
 */
export const miettinenNurminen = intervalMethod(issueOfRates, {
  ...MIETTINEN_NURMINEN,
  limits(table, z) {
    const score = (difference: number): number => rateDifferenceScore(table, difference);
    const estimate = rateDifferenceOf(table);
    const step = scaleOf(table);
    const lower = beyond(estimate, -step, (at) => score(at) > z);
    const upper = beyond(estimate, step, (at) => score(at) < -z);
    return [
      zeroOfDecreasing((at) => score(at) - z, lower, estimate),
      zeroOfDecreasing((at) => score(at) + z, estimate, upper),
    ];
  },
});

/** The score statistic of a supposed difference: decreasing, 0 at the estimate. */
function rateDifferenceScore(table: RateTable, difference: number): number {
  const { index, reference } = table;
  const referenceRate = constrainedReferenceRate(table, difference);
  const indexRate = Math.max(0, referenceRate + difference);
  const variance = indexRate / index.time + referenceRate / reference.time;
  const distance = rateDifferenceOf(table) - difference;
  return distance === 0 ? 0 : distance / Math.sqrt(variance);
}

/** The likeliest reference rate where the index rate lies a given difference above it. */
function constrainedReferenceRate({ index, reference }: RateTable, difference: number): number {
  const time = index.time + reference.time;
  const linear = time * difference - index.events - reference.events;
  const root = Math.sqrt(linear ** 2 + 4 * time * reference.events * difference);
  const rate =
    linear > 0
      ? (2 * reference.events * difference) / (linear + root)
      : (root - linear) / (2 * time);
  return Math.max(rate, -difference, 0);
}

function scaleOf({ index, reference }: RateTable): number {
  return (1 + index.events) / index.time + (1 + reference.events) / reference.time;
}

/** A point on one side of a start, step doubled until a statement holds there. */
function beyond(start: number, step: number, holds: (at: number) => boolean): number {
  let width = step;
  while (!holds(start + width)) {
    width *= 2;
  }
  return start + width;
}
