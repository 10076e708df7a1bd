import { breslowDay } from './breslow-day';
import { breslowDayTarone } from './breslow-day-tarone';
import { woolf } from './woolf';

/** Tests of homogeneity of an odds ratio, in the order in which they are offered. */
export const ODDS_RATIO_HOMOGENEITIES = { breslowDayTarone, breslowDay, woolf } as const;
