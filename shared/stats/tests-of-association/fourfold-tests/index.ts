import { barnard } from './barnard';
import { boschloo } from './boschloo';
import { fisherExact } from './fisher-exact';
import { fisherMidP } from './fisher-mid-p';
import { likelihoodRatio } from './likelihood-ratio';
import { pearsonChiSquare } from './pearson-chi-square';
import { yates } from './yates';

export type { FourfoldTest } from './fourfold-test';

/** Tests of no association in a fourfold table, in the order in which they are offered. */
export const FOURFOLD_TESTS = {
  pearsonChiSquare,
  yates,
  likelihoodRatio,
  fisherExact,
  fisherMidP,
  barnard,
  boschloo,
} as const;

/** Id of a test of a fourfold table. */
export type FourfoldTestId = keyof typeof FOURFOLD_TESTS;
