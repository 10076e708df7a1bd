import { cochranArmitageTest } from './cochran-armitage';
import { exactTrend } from './exact-trend';
import { linearByLinearTest } from './linear-by-linear';

export { cochranArmitage } from './cochran-armitage';
export { linearByLinear } from './linear-by-linear';
export type { ScoredTable } from './scored-table';
export type { TrendTest } from './trend-test';

/** Tests for trend, in the order in which they are offered. */
export const TREND_TESTS = {
  cochranArmitage: cochranArmitageTest,
  exactTrend,
  linearByLinear: linearByLinearTest,
} as const;

/** Id of a test for trend. */
export type TrendTestId = keyof typeof TREND_TESTS;
