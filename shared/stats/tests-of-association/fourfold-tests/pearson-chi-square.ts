import { pearsonOfFourfold } from '../pearson';
import type { FourfoldTest } from './fourfold-test';

/** Pearson's chi-square test as a member of the register; see `pearsonOfFourfold`. */
export const pearsonChiSquare = {
  id: 'pearsonChiSquare',
  label: 'Pearson chi-square test',
  shortLabel: 'chi-square',
  citation:
    'Pearson K. On the criterion that a given system of deviations from the probable in the ' +
    'case of a correlated system of variables is such that it can be reasonably supposed to ' +
    'have arisen from random sampling. Philosophical Magazine 1900;50:157-175.',
  effort: 'light',
  groupCap: null,
  test: pearsonOfFourfold,
} as const satisfies FourfoldTest;
