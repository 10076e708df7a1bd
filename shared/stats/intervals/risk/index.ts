import { agrestiCoull } from './agresti-coull';
import { clopperPearson } from './clopper-pearson';
import { jeffreys } from './jeffreys';
import { wilson } from './wilson';

/** Interval methods for the risk of one group, in the order in which they are offered. */
export const RISK_INTERVALS = { wilson, clopperPearson, agrestiCoull, jeffreys } as const;

/** Id of an interval method for a risk. */
export type RiskIntervalId = keyof typeof RISK_INTERVALS;
