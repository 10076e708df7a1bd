import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { issueOfGroup, issueOfLevel } from '../check-counts';
import { criticalValue } from '../distributions';
import type { EstimationIssue } from '../estimate';
import type { GroupCount } from '../fourfold-table';
import type { MethodWords } from '../intervals/interval-method';
import { varianceOfLogOdds, varianceOfLogRisk } from '../variances';
import type { Interaction } from './interaction';
import { waldTest } from './interaction';

/** Events of the four groups that two two-level factors make. */
export interface TwoFactorCounts {
  readonly both: GroupCount;
  readonly firstOnly: GroupCount;
  readonly secondOnly: GroupCount;
  /** The common reference of all three others. */
  readonly neither: GroupCount;
}

/**
 * What the excess is made of: risk ratios; or odds ratios, which is all that case-control data
 * give, and stands for risk ratios only where the outcome is rare.
 */
export type ExcessFrom = 'riskRatios' | 'oddsRatios';

/** How the limits and the test are named. */
export const EXCESS_RISK = {
  id: 'excessRisk',
  label: 'Relative excess risk due to interaction with delta-method limits',
  shortLabel: 'relative excess risk',
  citation:
    'Hosmer DW, Lemeshow S. Confidence interval estimation of interaction. ' +
    'Epidemiology 1992;3:452-456.',
} as const satisfies MethodWords;

/**
 * Relative excess risk due to interaction of two factors: the ratio of having both, less the ratios
 * of having one, plus 1; all against having neither. Above 0: more than the sum of the two.
 *
 * Takes events and totals of the four groups (in a case-control study: cases among all); gives a
 * number with limits by the delta method, and the test of 0. A factor that lowers the risk makes
 * the number meaningless: `protectiveFactor`, with the group at lowest risk as the `reference` to
 * take instead. An empty group gives `emptyGroup` with the `group`; a group without events (for
 * odds ratios: or without others) `zeroCell`.
 *
 * Source: Rothman (1986) Modern Epidemiology; Hosmer and Lemeshow (1992) Epidemiology 3:452-456;
 * the refusal after Knol, VanderWeele, Groenwold and others (2011) European Journal of Epidemiology
 * 26:433-438.
 * Example: odds ratios of 225/391, 6/18 and 8/26 against 3/23 give 3.74 (-1.84 to 9.32).
 */
export function excessRisk(
  counts: TwoFactorCounts,
  from: ExcessFrom,
  level: number,
): Result<Interaction, EstimationIssue> {
  const { valueOf, varianceOfLog } = OCCURRENCES[from];
  const issue = issueOfLevel(level) ?? issueOfGroups(counts, varianceOfLog);
  if (issue) {
    return failure(issue);
  }
  const base = valueOf(counts.neither);
  const ratios = {
    both: valueOf(counts.both) / base,
    firstOnly: valueOf(counts.firstOnly) / base,
    secondOnly: valueOf(counts.secondOnly) / base,
    neither: 1,
  };
  return ratios.firstOnly < 1 || ratios.secondOnly < 1
    ? failure({ code: 'protectiveFactor', facts: { reference: lowest(ratios) } })
    : estimateOf(counts, ratios, varianceOfLog, level);
}

/** Ratios of each group against neither. */
type Ratios = Readonly<Record<keyof TwoFactorCounts, number>>;

interface Occurrence {
  readonly valueOf: (count: GroupCount) => number;
  readonly varianceOfLog: (count: GroupCount) => number;
}

const OCCURRENCES: Readonly<Record<ExcessFrom, Occurrence>> = {
  riskRatios: {
    valueOf: ({ events, total }) => events / total,
    varianceOfLog: varianceOfLogRisk,
  },
  oddsRatios: {
    valueOf: ({ events, total }) => events / (total - events),
    varianceOfLog: varianceOfLogOdds,
  },
};

const GROUPS = ['both', 'firstOnly', 'secondOnly', 'neither'] as const;

function issueOfGroups(
  counts: TwoFactorCounts,
  varianceOfLog: Occurrence['varianceOfLog'],
): EstimationIssue | null {
  for (const group of GROUPS) {
    const issue = issueOfGroup(counts[group], group);
    if (issue) return issue;
    if (!Number.isFinite(varianceOfLog(counts[group]))) {
      return { code: 'zeroCell', facts: { group } };
    }
  }
  return null;
}

function lowest(ratios: Ratios): string {
  return GROUPS.reduce((least, group) => (ratios[group] < ratios[least] ? group : least));
}

function estimateOf(
  counts: TwoFactorCounts,
  ratios: Ratios,
  varianceOfLog: Occurrence['varianceOfLog'],
  level: number,
): Result<Interaction, EstimationIssue> {
  const sumOfRatios = ratios.both - ratios.firstOnly - ratios.secondOnly;
  const slopes: Ratios = {
    both: ratios.both,
    firstOnly: ratios.firstOnly,
    secondOnly: ratios.secondOnly,
    neither: sumOfRatios,
  };
  const variance = GROUPS.reduce(
    (sum, group) => sum + slopes[group] ** 2 * varianceOfLog(counts[group]),
    0,
  );
  if (variance === 0) {
    return failure({ code: 'zeroCell' });
  }
  const value = sumOfRatios + 1;
  const spread = criticalValue(level) * Math.sqrt(variance);
  const method = EXCESS_RISK.id;
  return success({
    estimate: { value, interval: { lower: value - spread, upper: value + spread, level, method } },
    test: waldTest(value, variance, method),
  });
}
