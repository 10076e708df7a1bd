import { chanZhang } from './chan-zhang';
import { katz } from './katz';
import { koopman } from './koopman';
import { miettinenNurminen } from './miettinen-nurminen';

/** Interval methods for a risk ratio, in the order in which they are offered. */
export const RISK_RATIO_INTERVALS = { katz, koopman, miettinenNurminen, chanZhang } as const;

/** Id of an interval method for a risk ratio. */
export type RiskRatioIntervalId = keyof typeof RISK_RATIO_INTERVALS;
