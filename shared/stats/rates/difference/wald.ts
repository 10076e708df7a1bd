import { intervalMethod } from '../../intervals/interval-method';
import { issueOfNoEvents, issueOfRates, rateDifferenceOf } from '../rate-count';
import type { RateTable } from '../rate-count';

/**
 * Wald's interval for a rate difference, index less reference.
 *
 * Takes events and person-time of two independent groups; gives events per unit of that time. With
 * no events in either group its width would be 0: `noEvents`. No person-time: `emptyGroup`.
 *
 * Source: Greenland and Rothman (1998), Modern Epidemiology, 2nd edition, chapter 14.
 */
export const wald = intervalMethod(
  (table: RateTable) => issueOfRates(table) ?? issueOfNoEvents(table),
  {
    id: 'wald',
    label: 'Wald',
    shortLabel: 'Wald',
    citation:
      'Greenland S, Rothman KJ. Introduction to categorical statistics. In: Rothman KJ, ' +
      'Greenland S, editors. Modern Epidemiology, 2nd edition. Lippincott-Raven 1998.',
    limits(table, z) {
      const difference = rateDifferenceOf(table);
      const spread = z * Math.sqrt(varianceOf(table));
      return [difference - spread, difference + spread];
    },
  },
);

function varianceOf({ index, reference }: RateTable): number {
  return index.events / index.time ** 2 + reference.events / reference.time ** 2;
}
