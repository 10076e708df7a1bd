import { chiSquareUpperTail } from './distributions';
import type { TestOutcome } from './estimate';

/** The outcome of a test whose statistic has a chi-square distribution. */
export function chiSquareOutcome(
  method: string,
  statistic: number,
  degreesOfFreedom = 1,
): TestOutcome {
  const pValue = chiSquareUpperTail(statistic, degreesOfFreedom);
  return { method, statistic, degreesOfFreedom, pValue };
}
