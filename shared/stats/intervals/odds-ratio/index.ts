import { conditionalExact } from './conditional-exact';
import { conditionalMidP } from './conditional-mid-p';
import { cornfield } from './cornfield';
import { miettinenNurminen } from './miettinen-nurminen';
import { woolf } from './woolf';

/** Interval methods for an odds ratio, in the order in which they are offered. */
export const ODDS_RATIO_INTERVALS = {
  woolf,
  cornfield,
  miettinenNurminen,
  conditionalExact,
  conditionalMidP,
} as const;

/** Id of an interval method for an odds ratio. */
export type OddsRatioIntervalId = keyof typeof ODDS_RATIO_INTERVALS;
