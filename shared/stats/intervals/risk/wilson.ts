import type { GroupCount } from '../../fourfold-table';
import type { Limits } from '../interval-method';
import { riskMethod } from './risk-method';

/**
 * Wilson's score interval for a risk.
 *
 * Takes events and total of one group; gives proportions in [0, 1]. Defined for no events (lower
 * limit exactly 0) and all events (upper exactly 1); an empty group gives `emptyGroup`.
 *
 * Source: Wilson (1927) Journal of the American Statistical Association 22:209-212.
 * Example: 15/148 at level 0.95 gives 0.0624 to 0.1605.
 */
export const wilson = riskMethod({
  id: 'wilson',
  label: 'Wilson score',
  shortLabel: 'Wilson',
  citation:
    'Wilson EB. Probable inference, the law of succession, and statistical inference. ' +
    'Journal of the American Statistical Association 1927;22:209-212.',
  limits: wilsonLimits,
});

/** Wilson's limits of a non-empty group at a normal quantile; other intervals build on them. */
export function wilsonLimits({ events, total }: GroupCount, z: number): Limits {
  const square = z * z;
  const others = total - events;
  const centre = 2 * events + square;
  const spread = z * Math.sqrt(square + (4 * events * others) / total);
  const scale = 2 * (total + square);
  return [
    events === 0 ? 0 : (centre - spread) / scale,
    others === 0 ? 1 : (centre + spread) / scale,
  ];
}
