import { issueOfRate } from '../rate-count';
import type { RateCount } from '../rate-count';
import { gammaQuantile, gammaUpperQuantile } from '../../distributions';
import { intervalMethod } from '../../intervals/interval-method';

/**
 * Garwood's exact Poisson interval for a rate.
 *
 * Takes events and person-time; gives events per unit of that time. Lower limit 0 without events;
 * no person-time gives `emptyGroup`.
 *
 * Source: Garwood (1936) Biometrika 28:437-442.
 * Example: 10 events in 2000 person-years at level 0.95 give 0.0024 to 0.0092.
 */
export const garwood = intervalMethod((count: RateCount) => issueOfRate(count, 'group'), {
  id: 'garwood',
  label: 'Garwood exact Poisson',
  shortLabel: 'exact Poisson',
  citation: 'Garwood F. Fiducial limits for the Poisson distribution. Biometrika 1936;28:437-442.',
  limits({ events, time }, _z, level) {
    const tail = (1 - level) / 2;
    return [
      events === 0 ? 0 : gammaQuantile(tail, events) / time,
      gammaUpperQuantile(tail, events + 1) / time,
    ];
  },
});
