import { garwood } from './garwood';

/** Interval methods for the rate of one group. */
export const RATE_INTERVALS = { garwood } as const;

/** Id of an interval method for a rate. */
export type RateIntervalId = keyof typeof RATE_INTERVALS;
