import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import type { ValueAndSlope } from '../../conditional/newton';
import { RANGE, zeroOfIncreasing } from '../../conditional/newton';
import { meanDistance } from '../../conditional/tail-sums';
import type { ConditionalCounts } from '../../conditional/tail-sums';
import type { Estimate, EstimationIssue } from '../../estimate';
import type { StratifiedTable } from '../../fourfold-table';
import { issueOfTest } from '../../tests-of-association/fourfold-issue';
import { informativeStrata } from '../pooled-estimate';
import type { ConditionalSum, ConditionalSupport } from './conditional-sum';
import { conditionalSum, conditionalSupport, startingRatio } from './conditional-sum';

/** The longest support that is summed: beyond, the approximation is as good and immediate. */
const LONGEST_SUPPORT = 20_000;

/** How an interval counts the observed number: whole for exact limits, half for mid-p. */
export interface ConditionalLimits {
  readonly method: string;
  readonly shareOfObserved: 1 | 0.5;
}

/**
 * The conditional maximum likelihood estimate of a common odds ratio with limits from the tails of
 * its conditional distribution, by Newton steps on the logarithm of the ratio.
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
  const start = startingRatio(strata, support);
  const sum = conditionalSum(strata, support, start);
  const tail = (1 - level) / 2;
  const root = (rising: (tails: ConditionalCounts) => ValueAndSlope): number =>
    Math.exp(rootOf(strata, support, { sum, start }, rising));
  const none = support.observed === support.smallest;
  return {
    value: none ? 0 : root(meanDistance),
    interval: {
      lower: none ? 0 : root((tails) => upperTail(tails, shareOfObserved, tail)),
      upper: root((tails) => lowerTail(tails, shareOfObserved, tail)),
      level,
      method,
    },
  };
}

/** A distribution and the logarithm of the ratio at which it was laid out. */
interface LaidOut {
  readonly sum: ConditionalSum;
  readonly start: number;
}

/** Where a rising function of the tails is 0; laid out anew there when that is too far away. */
function rootOf(
  strata: StratifiedTable,
  support: ConditionalSupport,
  { sum, start }: LaidOut,
  rising: (tails: ConditionalCounts) => ValueAndSlope,
): number {
  const root = zeroOfIncreasing((logRatio) => rising(sum.tailsAt(logRatio)), start, RANGE);
  if (sum.covers(root)) {
    return root;
  }
  const nearer = { sum: conditionalSum(strata, support, root), start: root };
  return rootOf(strata, support, nearer, rising);
}

/** How far the probability of as many events or more lies above the wanted one. */
function upperTail(tails: ConditionalCounts, share: number, wanted: number): ValueAndSlope {
  const { above, at, momentBelow, momentAbove } = tails;
  const probability = above + share * at;
  const slope = momentAbove - probability * (momentBelow + momentAbove);
  return { value: probability - wanted, slope };
}

/** How far the probability of as many events or fewer lies below the wanted one. */
function lowerTail(tails: ConditionalCounts, share: number, wanted: number): ValueAndSlope {
  const { below, at, momentBelow, momentAbove } = tails;
  const probability = below + share * at;
  const slope = probability * (momentBelow + momentAbove) - momentBelow;
  return { value: wanted - probability, slope };
}
