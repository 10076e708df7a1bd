import { newcombe } from './newcombe';
import { tango } from './tango';
import { wald } from './wald';

/** Intervals for a difference of paired proportions, in the order in which they are offered. */
export const PAIRED_DIFFERENCE_INTERVALS = {
  newcombePaired: newcombe,
  tango,
  waldPaired: wald,
} as const;

/** Id of an interval for a difference of paired proportions. */
export type PairedDifferenceIntervalId = keyof typeof PAIRED_DIFFERENCE_INTERVALS;
