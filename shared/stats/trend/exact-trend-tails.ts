import type { ScoredGroup } from '../contingency-table';
import { sumOf } from './trend-issue';

/**
 * The probability of score sums of the events at least as far from their expectation as the
 * observed one, all margins fixed; scores are whole numbers from 0 up. Null when it would take more
 * than so many steps.
 *
 * Groups are added one by one to the distribution of events and score sum. Each group's weights are
 * those of a binomial with the overall risk, which all margins fixed cancels, so that nothing
 * underflows in large groups with few events.
 */
export function exactTrendTails(groups: readonly ScoredGroup[], mostSteps: number): number | null {
  const rarer = withRarerOutcome(groups);
  const events = sumOf(rarer, (group) => group.events);
  const sizes = { events, largest: Math.max(...rarer.map(({ score }) => score)) };
  if (stepsOf(rarer, sizes) > mostSteps) {
    return null;
  }
  const share = events / sumOf(rarer, (group) => group.total);
  let table = new Float64Array((events + 1) * widthOf(sizes));
  table[0] = 1;
  for (const group of rarer) {
    table = withGroup(table, group, share, sizes);
  }
  return tailOf(table.subarray(events * widthOf(sizes)), rarer);
}

interface Sizes {
  /** Events over all groups. */
  readonly events: number;
  /** The largest score. */
  readonly largest: number;
}

/** How many score sums there can be. */
function widthOf({ events, largest }: Sizes): number {
  return events * largest + 1;
}

/** A trend of the others is that of the events turned round; the rarer make a smaller table. */
function withRarerOutcome(groups: readonly ScoredGroup[]): readonly ScoredGroup[] {
  const events = sumOf(groups, (group) => group.events);
  const others = sumOf(groups, (group) => group.total) - events;
  const turned = ({ events: own, total, score }: ScoredGroup): ScoredGroup => ({
    events: total - own,
    total,
    score,
  });
  return events <= others ? groups : groups.map(turned);
}

/** Additions, and the clearing of a table for each group; so many events need no counting. */
function stepsOf(groups: readonly ScoredGroup[], sizes: Sizes): number {
  const { events, largest } = sizes;
  if (events > MOST_EVENTS) {
    return Infinity;
  }
  const cells = (events + 1) * widthOf(sizes);
  return sumOf(groups, ({ total }) => {
    let steps = 4 * cells;
    for (let before = 0; before <= events; before += 1) {
      steps += (before * largest + 1) * (Math.min(total, events - before) + 1);
    }
    return steps;
  });
}

/** The square of more would already pass any number of steps. */
const MOST_EVENTS = 10_000;

/** The distribution by events and score sum with one group more. */
function withGroup(
  table: Float64Array,
  { total, score }: ScoredGroup,
  share: number,
  sizes: Sizes,
): Float64Array<ArrayBuffer> {
  const { events, largest } = sizes;
  const width = widthOf(sizes);
  const next = new Float64Array(table.length);
  const weights = binomialWeights(total, share, events);
  for (let before = 0; before <= events; before += 1) {
    const row = table.subarray(before * width, before * width + before * largest + 1);
    const most = Math.min(total, events - before);
    for (let added = 0; added <= most; added += 1) {
      const moved = next.subarray((before + added) * width + added * score);
      addMultiple(moved, row, weights[added] ?? 0);
    }
  }
  return next;
}

function addMultiple(to: Float64Array, from: Float64Array, times: number): void {
  for (let at = 0; at < from.length; at += 1) {
    to[at] = (to[at] as number) + times * (from[at] as number);
  }
}

/** Binomial weights from 0 up, scaled to a largest of 1. */
function binomialWeights(total: number, share: number, events: number): readonly number[] {
  const most = Math.min(total, events);
  const odds = share / (1 - share);
  const mode = Math.min(most, Math.floor((total + 1) * share));
  const ratioUp = (count: number): number => ((total - count) / (count + 1)) * odds;
  const weights = new Array<number>(most + 1).fill(1);
  for (let count = mode; count < most; count += 1) {
    weights[count + 1] = (weights[count] ?? 0) * ratioUp(count);
  }
  for (let count = mode; count > 0; count -= 1) {
    weights[count - 1] = (weights[count] ?? 0) / ratioUp(count - 1);
  }
  return weights;
}

/** Distances are compared as whole numbers: total × sum less events × expected scores. */
function tailOf(weights: Float64Array, groups: readonly ScoredGroup[]): number {
  const total = sumOf(groups, (group) => group.total);
  const events = sumOf(groups, (group) => group.events);
  const centre = events * sumOf(groups, (group) => group.total * group.score);
  const observed = sumOf(groups, (group) => group.events * group.score);
  const distance = Math.abs(total * observed - centre);
  const inTail = weights.map((weight, sum) =>
    Math.abs(total * sum - centre) >= distance ? weight : 0,
  );
  return Math.min(1, sumOfWeights(inTail) / sumOfWeights(weights));
}

function sumOfWeights(weights: Float64Array): number {
  return weights.reduce((sum, weight) => sum + weight, 0);
}
