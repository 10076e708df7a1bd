import { chiSquareUpperTail } from '../distributions';
import type { Estimate, TestOutcome } from '../estimate';

/** How an effect differs between two strata: an estimate with limits, a test of no difference. */
export interface Interaction {
  readonly estimate: Estimate;
  readonly test: TestOutcome;
}

/** Wald's test of a number that is 0 without interaction. */
export function waldTest(value: number, variance: number, method: string): TestOutcome {
  const statistic = (value / variance) * value;
  return { method, statistic, degreesOfFreedom: 1, pValue: chiSquareUpperTail(statistic, 1) };
}
