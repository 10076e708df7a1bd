import type { MethodWords } from './interval-method';

/** One paper gives the score intervals of differences and ratios of risks, odds and rates. */
export const MIETTINEN_NURMINEN = {
  id: 'miettinenNurminen',
  label: 'Miettinen–Nurminen score',
  shortLabel: 'Miettinen–Nurminen',
  citation:
    'Miettinen O, Nurminen M. Comparative analysis of two rates. ' +
    'Statistics in Medicine 1985;4:213-226.',
} as const satisfies MethodWords;
