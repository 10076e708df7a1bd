import { exactConditional } from './exact-conditional';
import { midPConditional } from './mid-p-conditional';
import { score } from './score';
import { waldLog } from './wald-log';

/** Interval methods for a rate ratio, in the order in which they are offered. */
export const RATE_RATIO_INTERVALS = { waldLog, exactConditional, midPConditional, score } as const;

/** Id of an interval method for a rate ratio. */
export type RateRatioIntervalId = keyof typeof RATE_RATIO_INTERVALS;
