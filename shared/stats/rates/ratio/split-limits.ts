import type { Limits } from '../../intervals/interval-method';
import type { RateTable } from '../rate-count';

/** Lower limit of the odds that an event falls into the first of two groups, given their events. */
export type LowerOdds = (events: number, others: number) => number;

/**
 * Limits of a rate ratio from those of the share of all events that fell into the index group:
 * given their sum, the events of two Poisson counts split binomially. Both limits come from one
 * rule, so that exchanging the groups inverts them exactly.
 */
export function limitsOfSplit({ index, reference }: RateTable, lowerOdds: LowerOdds): Limits {
  const times = reference.time / index.time;
  return [
    index.events === 0 ? 0 : lowerOdds(index.events, reference.events) * times,
    times / lowerOdds(reference.events, index.events),
  ];
}
