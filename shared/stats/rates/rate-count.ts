import type { EstimationIssue } from '../estimate';

/** Events and the person-time (or the population) in which they were seen; `time` is above 0. */
export interface RateCount {
  readonly events: number;
  readonly time: number;
}

/** Rates of two independent groups: index against reference. */
export interface RateTable {
  readonly index: RateCount;
  readonly reference: RateCount;
}

/** One layer of a third factor, with the rates of both groups in it. */
export interface RateStratum {
  readonly id: string;
  readonly table: RateTable;
}

/** Why one group gives no rate, or null: counts that cannot be, or no person-time. */
export function issueOfRate({ events, time }: RateCount, group: string): EstimationIssue | null {
  const valid = Number.isSafeInteger(events) && events >= 0 && Number.isFinite(time) && time >= 0;
  if (!valid || (time === 0 && events > 0)) {
    return { code: 'invalidCounts', facts: { group } };
  }
  return time === 0 ? { code: 'emptyGroup', facts: { group } } : null;
}

/** Why two groups give no contrast of rates, or null. */
export function issueOfRates({ index, reference }: RateTable): EstimationIssue | null {
  return issueOfRate(index, 'index') ?? issueOfRate(reference, 'reference');
}

/** That nobody in either group had the event, or null. */
export function issueOfNoEvents({ index, reference }: RateTable): EstimationIssue | null {
  const events = index.events + reference.events;
  return events === 0 ? { code: 'noEvents', facts: { events } } : null;
}

/** Events over person-time. */
export function rateOf({ events, time }: RateCount): number {
  return events / time;
}

/** Index rate less reference rate. */
export function rateDifferenceOf({ index, reference }: RateTable): number {
  return rateOf(index) - rateOf(reference);
}

/** Index rate over reference rate. */
export function rateRatioOf({ index, reference }: RateTable): number {
  return (index.events / reference.events) * (reference.time / index.time);
}
