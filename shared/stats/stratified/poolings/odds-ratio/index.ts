import { exactConditional } from './exact-conditional';
import { exactMidP } from './exact-mid-p';
import { robinsBreslowGreenland } from './robins-breslow-greenland';

/** Ways to pool an odds ratio, in the order in which they are offered. */
export const POOLED_ODDS_RATIOS = { robinsBreslowGreenland, exactConditional, exactMidP } as const;

/** Id of a way to pool an odds ratio. */
export type PooledOddsRatioId = keyof typeof POOLED_ODDS_RATIOS;
