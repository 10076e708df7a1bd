import { rateRatioOf } from '../rate-count';
import { issueOfLogRateRatio, rateRatioMethod } from './rate-ratio-method';

/**
 * Wald's interval for a rate ratio on the log scale, index over reference.
 *
 * Takes events and person-time of two independent groups; gives ratios. A group without events
 * gives `zeroCell` (nothing is added to counts), none in either `noEvents`.
 *
 * Source: Greenland and Rothman (1998), Modern Epidemiology, 2nd edition, chapter 14.
 */
export const waldLog = rateRatioMethod(
  {
    id: 'waldLog',
    label: 'Wald on the log scale',
    shortLabel: 'log',
    citation:
      'Greenland S, Rothman KJ. Introduction to categorical statistics. In: Rothman KJ, ' +
      'Greenland S, editors. Modern Epidemiology, 2nd edition. Lippincott-Raven 1998.',
    limits(table, z) {
      const ratio = rateRatioOf(table);
      const factor = Math.exp(z * Math.sqrt(1 / table.index.events + 1 / table.reference.events));
      return [ratio / factor, ratio * factor];
    },
  },
  issueOfLogRateRatio,
);
