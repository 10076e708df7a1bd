import { fisherOfFourfold } from '../fisher';
import type { FourfoldTest } from './fourfold-test';

/** Fisher's exact test as a member of the register; see `fisherOfFourfold`. */
export const fisherExact = {
  id: 'fisherExact',
  label: "Fisher's exact test, two-sided by the probability of tables",
  shortLabel: "Fisher's exact",
  citation:
    'Fisher RA. The logic of inductive inference. ' +
    'Journal of the Royal Statistical Society 1935;98:39-82.',
  effort: 'light',
  groupCap: null,
  test: fisherOfFourfold,
} as const satisfies FourfoldTest;
