import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { issueOfLevel } from '../check-counts';
import { criticalValue } from '../distributions';
import type { EstimationIssue } from '../estimate';
import type { FourfoldTable } from '../fourfold-table';
import type { MethodWords } from '../intervals/interval-method';
import { issueOfLogOddsRatio } from '../intervals/odds-ratio/odds-ratio-method';
import { issueOfLogRiskRatio } from '../intervals/risk-ratio/risk-ratio-method';
import { oddsRatioOf, riskRatioOf } from '../point-estimates';
import { varianceOfLogOddsRatio, varianceOfLogRiskRatio } from '../variances';
import type { Interaction } from './interaction';
import { waldTest } from './interaction';

/** Which ratio is compared between two strata. */
export type RatioCompared = 'riskRatio' | 'oddsRatio';

/** How the limits and the test are named. */
export const RATIO_OF_RATIOS = {
  id: 'ratioOfRatios',
  label: 'Ratio of two ratios with log limits',
  shortLabel: 'ratio of ratios',
  citation:
    'Altman DG, Bland JM. Interaction revisited: the difference between two estimates. ' +
    'British Medical Journal 2003;326:219.',
} as const satisfies MethodWords;

/**
 * Interaction on the ratio scale: the first stratum's risk or odds ratio over the second's.
 *
 * Takes events and totals of two independent strata; gives a ratio with log limits, and the test of
 * a ratio of 1. A zero cell that leaves either ratio without log limits (or the ratio of ratios
 * without variance) gives `zeroCell`, an empty group `emptyGroup`. For more strata take a test of
 * homogeneity.
 *
 * Source: Altman and Bland (2003) British Medical Journal 326:219.
 * Example: risk ratios of 0.67 and 0.88 have the ratio 0.76.
 */
export function ratioOfRatios(
  first: FourfoldTable,
  second: FourfoldTable,
  ratio: RatioCompared,
  level: number,
): Result<Interaction, EstimationIssue> {
  const { issueOf, valueOf, varianceOf } = RATIOS[ratio];
  const issue = issueOfLevel(level) ?? issueOf(first) ?? issueOf(second);
  if (issue) {
    return failure(issue);
  }
  const value = valueOf(first) / valueOf(second);
  const variance = varianceOf(first) + varianceOf(second);
  if (variance === 0) {
    return failure({ code: 'zeroCell' });
  }
  const factor = Math.exp(criticalValue(level) * Math.sqrt(variance));
  const method = RATIO_OF_RATIOS.id;
  return success({
    estimate: { value, interval: { lower: value / factor, upper: value * factor, level, method } },
    test: waldTest(Math.log(value), variance, method),
  });
}

interface ComparedRatio {
  readonly issueOf: (table: FourfoldTable) => EstimationIssue | null;
  readonly valueOf: (table: FourfoldTable) => number;
  readonly varianceOf: (table: FourfoldTable) => number;
}

const RATIOS: Readonly<Record<RatioCompared, ComparedRatio>> = {
  riskRatio: {
    issueOf: issueOfLogRiskRatio,
    valueOf: riskRatioOf,
    varianceOf: varianceOfLogRiskRatio,
  },
  oddsRatio: {
    issueOf: issueOfLogOddsRatio,
    valueOf: oddsRatioOf,
    varianceOf: varianceOfLogOddsRatio,
  },
};
