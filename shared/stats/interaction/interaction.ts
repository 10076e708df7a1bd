import { chiSquareOutcome } from '../chi-square-outcome';
import type { Estimate, TestOutcome } from '../estimate';

/** How an effect differs between two strata: an estimate with limits, a test of no difference. */
export interface Interaction {
  readonly estimate: Estimate;
  readonly test: TestOutcome;
}

/** Wald's test of a number that is 0 without interaction. */
export function waldTest(value: number, variance: number, method: string): TestOutcome {
  return chiSquareOutcome(method, (value / variance) * value);
}
