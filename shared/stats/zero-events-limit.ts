import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { issueOfGroup, issueOfLevel } from './check-counts';
import type { EstimationIssue } from './estimate';

/**
 * The exact one-sided upper limit of a risk when none of `total` had the event: the risk at which
 * that has a probability of 1 - level, near 3 / total at level 0.95.
 *
 * One-sided: the whole of 1 - level lies above, where two-sided intervals put half of it. Gives a
 * proportion; `emptyGroup` for nobody, `invalidCounts` for a total that is no whole number.
 *
 * Source: Hanley and Lippman-Hand (1983) Journal of the American Medical Association 249:1743-1745.
 * Example: 0 of 30 at level 0.95 gives 0.0950.
 */
export function zeroEventsUpperLimit(
  total: number,
  level: number,
): Result<number, EstimationIssue> {
  const issue = issueOfLevel(level) ?? issueOfGroup({ events: 0, total }, 'group');
  return issue ? failure(issue) : success(0 - Math.expm1(Math.log1p(-level) / total));
}

/**
 * The exact one-sided lower limit of a risk when all of `total` had the event: the mirror image of
 * `zeroEventsUpperLimit`, with the same issues.
 *
 * Example: 30 of 30 at level 0.95 gives 0.9050.
 */
export function allEventsLowerLimit(total: number, level: number): Result<number, EstimationIssue> {
  const issue = issueOfLevel(level) ?? issueOfGroup({ events: total, total }, 'group');
  return issue ? failure(issue) : success(Math.exp(Math.log1p(-level) / total));
}
