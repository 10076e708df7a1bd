import { betaQuantile } from '../../distributions';
import type { GroupCount } from '../../fourfold-table';
import type { Limits } from '../interval-method';
import { riskMethod } from './risk-method';

/**
 * Clopper and Pearson's exact interval for a risk.
 *
 * Takes events and total of one group; gives proportions in [0, 1]. Lower limit 0 with no events,
 * upper 1 with all events; an empty group gives `emptyGroup`.
 *
 * Source: Clopper and Pearson (1934) Biometrika 26:404-413.
 * Example: 15/148 at level 0.95 gives 0.0578 to 0.1617.
 */
export const clopperPearson = riskMethod({
  id: 'clopperPearson',
  label: 'Clopper–Pearson exact',
  shortLabel: 'Clopper–Pearson',
  citation:
    'Clopper CJ, Pearson ES. The use of confidence or fiducial limits illustrated in the case ' +
    'of the binomial. Biometrika 1934;26:404-413.',
  limits: (count, _z, level) => clopperPearsonLimits(count, level),
});

/** Clopper and Pearson's limits of a non-empty group; other intervals build on them. */
export function clopperPearsonLimits({ events, total }: GroupCount, level: number): Limits {
  const others = total - events;
  const tail = (1 - level) / 2;
  return [
    events === 0 ? 0 : betaQuantile(tail, events, others + 1),
    others === 0 ? 1 : betaQuantile(1 - tail, events + 1, others),
  ];
}
