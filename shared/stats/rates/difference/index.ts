import { miettinenNurminen } from './miettinen-nurminen';
import { wald } from './wald';

/** Interval methods for a rate difference, in the order in which they are offered. */
export const RATE_DIFFERENCE_INTERVALS = { wald, miettinenNurminen } as const;

/** Id of an interval method for a rate difference. */
export type RateDifferenceIntervalId = keyof typeof RATE_DIFFERENCE_INTERVALS;
