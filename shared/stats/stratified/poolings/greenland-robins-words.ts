import type { MethodWords } from '../../intervals/interval-method';

/** One paper gives the variances of the pooled difference and of the pooled ratio. */
export const GREENLAND_ROBINS = {
  id: 'greenlandRobins',
  label: 'Mantel–Haenszel with the variance of Greenland and Robins',
  shortLabel: 'Mantel–Haenszel (Greenland–Robins)',
  citation:
    'Greenland S, Robins JM. Estimation of a common effect parameter from sparse follow-up ' +
    'data. Biometrics 1985;41:55-68.',
} as const satisfies MethodWords;
