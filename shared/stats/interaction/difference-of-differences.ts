import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { issueOfLevel, issueOfTable } from '../check-counts';
import { criticalValue } from '../distributions';
import type { EstimationIssue } from '../estimate';
import type { FourfoldTable } from '../fourfold-table';
import { clampLimits } from '../intervals/clamp';
import type { Limits, MethodWords } from '../intervals/interval-method';
import { newcombe } from '../intervals/risk-difference/newcombe';
import { riskDifferenceOf } from '../point-estimates';
import { varianceOfDifference } from '../variances';
import type { Interaction } from './interaction';
import { waldTest } from './interaction';

/**
 * Interaction on the difference scale: the first stratum's risk difference less the second's; a
 * member of DIFFERENCES_OF_DIFFERENCES.
 *
 * `contrast` takes events and totals of two independent strata; gives a number in [-2, 2] with
 * limits, and Wald's test of 0. An empty group gives `emptyGroup`; risks of 0 and 1 only, which
 * leave no variance, `zeroCell`. For more strata take a test of homogeneity.
 */
export interface DifferenceOfDifferences extends MethodWords {
  contrast(
    first: FourfoldTable,
    second: FourfoldTable,
    level: number,
  ): Result<Interaction, EstimationIssue>;
}

/** Limits of the difference of two differences. */
type LimitsOfContrast = (first: FourfoldTable, second: FourfoldTable, level: number) => Limits;

/**
 * Wald's limits. Source: as the interaction contrast in Rothman, Greenland and Lash (2008) Modern
 * Epidemiology.
 */
const wald = {
  id: 'waldContrast',
  label: 'Difference of two risk differences with Wald limits',
  shortLabel: 'Wald contrast',
  citation:
    'Rothman KJ, Greenland S, Lash TL. Modern epidemiology. 3rd edition. ' +
    'Philadelphia: Lippincott Williams & Wilkins; 2008.',
  contrast: contrastBy('waldContrast', (first, second, level) => {
    const value = riskDifferenceOf(first) - riskDifferenceOf(second);
    const spread = criticalValue(level) * Math.sqrt(varianceOfContrast(first, second));
    return [value - spread, value + spread];
  }),
} as const satisfies DifferenceOfDifferences;

/**
 * Limits put together from the two Newcombe intervals by the square-and-add rule. Source: Zou and
 * Donner (2008) Statistics in Medicine 27:1693-1702.
 */
const squareAndAdd = {
  id: 'squareAndAddContrast',
  label: 'Difference of two risk differences, square-and-add of Newcombe intervals',
  shortLabel: 'square-and-add contrast',
  citation:
    'Zou GY, Donner A. Construction of confidence limits about effect measures: a general ' +
    'approach. Statistics in Medicine 2008;27:1693-1702.',
  contrast: contrastBy('squareAndAddContrast', squareAndAddLimits),
} as const satisfies DifferenceOfDifferences;

/** Ways to put limits around a difference of risk differences, in the order of offer. */
export const DIFFERENCES_OF_DIFFERENCES = {
  squareAndAddContrast: squareAndAdd,
  waldContrast: wald,
} as const;

function contrastBy(
  method: string,
  limitsOf: LimitsOfContrast,
): DifferenceOfDifferences['contrast'] {
  return (first, second, level) => {
    const issue = issueOfLevel(level) ?? issueOfTable(first) ?? issueOfTable(second);
    if (issue) {
      return failure(issue);
    }
    const variance = varianceOfContrast(first, second);
    if (variance === 0) {
      return failure({ code: 'zeroCell' });
    }
    const value = riskDifferenceOf(first) - riskDifferenceOf(second);
    const [lower, upper] = clampLimits(limitsOf(first, second, level), -2, 2);
    return success({
      estimate: { value, interval: { lower, upper, level, method } },
      test: waldTest(value, variance, 'waldContrast'),
    });
  };
}

function squareAndAddLimits(first: FourfoldTable, second: FourfoldTable, level: number): Limits {
  const value = riskDifferenceOf(first) - riskDifferenceOf(second);
  const one = marginsOf(first, level);
  const other = marginsOf(second, level);
  return [value - Math.hypot(one.below, other.above), value + Math.hypot(one.above, other.below)];
}

/** How far Newcombe's limits lie from the difference. */
function marginsOf(table: FourfoldTable, level: number): { below: number; above: number } {
  const value = riskDifferenceOf(table);
  const interval = newcombe.interval(table, level);
  return interval.ok
    ? { below: value - interval.value.lower, above: interval.value.upper - value }
    : { below: NaN, above: NaN };
}

function varianceOfContrast(first: FourfoldTable, second: FourfoldTable): number {
  return varianceOfDifference(first) + varianceOfDifference(second);
}
