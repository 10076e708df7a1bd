import { clampLimits } from '../clamp';
import { riskMethod } from './risk-method';

/**
 * Agresti and Coull's adjusted Wald interval for a risk, with z²/2 added to events and others.
 *
 * Takes events and total of one group; gives proportions, cut to [0, 1]. An empty group gives
 * `emptyGroup`.
 *
 * Source: Agresti and Coull (1998) The American Statistician 52:119-126.
 */
export const agrestiCoull = riskMethod({
  id: 'agrestiCoull',
  label: 'Agresti–Coull adjusted Wald',
  shortLabel: 'Agresti–Coull',
  citation:
    'Agresti A, Coull BA. Approximate is better than "exact" for interval estimation of ' +
    'binomial proportions. The American Statistician 1998;52:119-126.',
  limits({ events, total }, z) {
    const size = total + z * z;
    const centre = (events + (z * z) / 2) / size;
    const spread = z * Math.sqrt((centre * (1 - centre)) / size);
    return clampLimits([centre - spread, centre + spread], 0, 1);
  },
});
