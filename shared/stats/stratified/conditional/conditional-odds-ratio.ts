import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import type { Estimate, EstimationIssue } from '../../estimate';
import type { StratifiedTable } from '../../fourfold-table';
import { zeroOfDecreasing } from '../../intervals/score/bisection';
import { issueOfTest } from '../../tests-of-association/fourfold-issue';
import { informativeStrata } from '../pooled-estimate';
import type { ConditionalSupport, ConditionalTails } from './conditional-sum';
import { FARTHEST, conditionalSum, conditionalSupport } from './conditional-sum';

/** The longest support that is summed: beyond, the approximation is as good and immediate. */
const LONGEST_SUPPORT = 20_000;

/** How an interval counts the observed number: whole for exact limits, half for mid-p. */
export interface ConditionalLimits {
  readonly method: string;
  readonly shareOfObserved: 1 | 0.5;
}

/**
 * The conditional maximum likelihood estimate of a common odds ratio with limits from the tails of
 * its conditional distribution, by bisection to the last bit of its logarithm.
 */
export function conditionalOddsRatio(
  strata: StratifiedTable,
  level: number,
  limits: ConditionalLimits,
): Result<Estimate, EstimationIssue> {
  const informative = informativeStrata(strata, level, issueOfTest);
  if (!informative.ok) {
    return informative;
  }
  const support = conditionalSupport(informative.value);
  const issue = issueOfSupport(support);
  return issue ? failure(issue) : success(estimateOf(informative.value, support, level, limits));
}

function issueOfSupport({
  observed,
  smallest,
  largest,
}: ConditionalSupport): EstimationIssue | null {
  if (observed === largest) {
    return { code: 'zeroCell' };
  }
  const facts = { cap: LONGEST_SUPPORT, instead: 'robinsBreslowGreenland' };
  return largest - smallest >= LONGEST_SUPPORT ? { code: 'tooLarge', facts } : null;
}

function estimateOf(
  strata: StratifiedTable,
  support: ConditionalSupport,
  level: number,
  { method, shareOfObserved }: ConditionalLimits,
): Estimate {
  const tails = conditionalSum(strata, support);
  const tail = (1 - level) / 2;
  const withObserved = (outside: number, { at }: ConditionalTails): number =>
    outside + shareOfObserved * at;
  const root = (valueOf: (at: ConditionalTails) => number): number =>
    Math.exp(zeroOfDecreasing((logRatio) => valueOf(tails(logRatio)), -FARTHEST, FARTHEST));
  const none = support.observed === support.smallest;
  return {
    value: none ? 0 : root(({ mean }) => support.observed - mean),
    interval: {
      lower: none ? 0 : root((at) => tail - withObserved(at.above, at)),
      upper: root((at) => withObserved(at.below, at) - tail),
      level,
      method,
    },
  };
}
