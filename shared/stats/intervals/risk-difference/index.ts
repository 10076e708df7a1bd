import { agrestiCaffo } from './agresti-caffo';
import { agrestiMin } from './agresti-min';
import { chanZhang } from './chan-zhang';
import { miettinenNurminen } from './miettinen-nurminen';
import { newcombe } from './newcombe';
import { wald } from './wald';

/** Interval methods for a risk difference, in the order in which they are offered. */
export const RISK_DIFFERENCE_INTERVALS = {
  newcombe,
  wald,
  agrestiCaffo,
  miettinenNurminen,
  chanZhang,
  agrestiMin,
} as const;

/** Id of an interval method for a risk difference. */
export type RiskDifferenceIntervalId = keyof typeof RISK_DIFFERENCE_INTERVALS;
