import { wilsonLimits } from '../../intervals/risk/wilson';
import { rateRatioMethod } from './rate-ratio-method';
import { limitsOfSplit } from './split-limits';

/**
 * Score interval for a rate ratio, index over reference.
 *
 * Wilson's limits of the share of all events that fell into the index group, turned into ratios.
 * Lower limit 0 without events in the index group; none in the reference group gives `zeroCell`,
 * in either `noEvents`.
 *
 * Source: Graham, Mengersen and Morton (2003) Statistics in Medicine 22:2071-2083.
 */
export const score = rateRatioMethod({
  id: 'score',
  label: 'Score (Wilson limits of the split of events)',
  shortLabel: 'score',
  citation:
    'Graham PL, Mengersen K, Morton AP. Confidence limits for the ratio of two rates based on ' +
    'likelihood scores: non-iterative method. Statistics in Medicine 2003;22:2071-2083.',
  limits: (table, z) => limitsOfSplit(table, (events, others) => lowerOdds(events, others, z)),
});

function lowerOdds(events: number, others: number, z: number): number {
  const total = events + others;
  const [lowerShare] = wilsonLimits({ events, total }, z);
  const [, upperRest] = wilsonLimits({ events: others, total }, z);
  return lowerShare / upperRest;
}
