import { betaQuantile } from '../../distributions';
import { riskMethod } from './risk-method';

/**
 * Jeffreys' equal-tailed interval for a risk, as modified at the ends: lower limit 0 with no
 * events, upper limit 1 with all events.
 *
 * Takes events and total of one group; gives proportions in [0, 1]; an empty group gives
 * `emptyGroup`.
 *
 * Source: Brown, Cai and DasGupta (2001) Statistical Science 16:101-133.
 * Example: 13/16 at level 0.95 gives 0.5792 to 0.9442.
 */
export const jeffreys = riskMethod({
  id: 'jeffreys',
  label: 'Jeffreys',
  shortLabel: 'Jeffreys',
  citation:
    'Brown LD, Cai TT, DasGupta A. Interval estimation for a binomial proportion. ' +
    'Statistical Science 2001;16:101-133.',
  limits({ events, total }, _z, level) {
    const others = total - events;
    const tail = (1 - level) / 2;
    return [
      events === 0 ? 0 : betaQuantile(tail, events + 0.5, others + 0.5),
      others === 0 ? 1 : betaQuantile(1 - tail, events + 0.5, others + 0.5),
    ];
  },
});
