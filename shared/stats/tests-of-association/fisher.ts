import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { hypergeometricSupport, logHypergeometric } from '../distributions';
import type { Urn } from '../distributions';
import type { EstimationIssue, TestOutcome } from '../estimate';
import type { FourfoldTable } from '../fourfold-table';
import { urnOf } from '../urn-of';
import { issueOfTest } from './fourfold-issue';
import { noLikelierThan } from './hypergeometric-ties';

/**
 * Fisher's exact test of a fourfold table, two-sided: the probability, with all margins fixed, of
 * tables no likelier than the one observed. Ties are decided with whole numbers.
 *
 * Takes events and totals of two groups; gives no statistic. An empty group gives `emptyGroup`;
 * events in nobody or in everybody give `emptyMargin`.
 *
 * Source: Fisher (1935) Journal of the Royal Statistical Society 98:39-82.
 * Example: 3/4 against 1/4 gives p = 0.4857.
 */
export function fisherOfFourfold(table: FourfoldTable): Result<TestOutcome, EstimationIssue> {
  const issue = issueOfTest(table);
  return issue
    ? failure(issue)
    : success({
        method: 'fisherExact',
        statistic: null,
        degreesOfFreedom: null,
        pValue: twoSided(table.index.events, urnOf(table)),
      });
}

function twoSided(observed: number, urn: Urn): number {
  const { smallest, largest } = hypergeometricSupport(urn);
  const mode = modeOf(urn);
  const upwards = observed >= mode;
  const opposite = upwards
    ? outermost(observed, smallest, mode, urn)
    : outermost(observed, largest, mode, urn);
  const ownTail = tail(observed, upwards ? largest : smallest, urn);
  const oppositeTail = opposite === null ? 0 : tail(opposite, upwards ? smallest : largest, urn);
  return Math.min(1, ownTail + oppositeTail);
}

function modeOf({ marked, unmarked, drawn }: Urn): number {
  return Math.floor(((drawn + 1) * (marked + 1)) / (marked + unmarked + 2));
}

/**
 * The count nearest to the mode, on the side of `end`, that is no likelier than the observed one;
 * null when even the end is likelier. Probabilities fall from the mode to the end.
 */
function outermost(observed: number, end: number, mode: number, urn: Urn): number | null {
  const isNoLikelier = noLikelierThan(observed, urn);
  if (end === observed || !isNoLikelier(end)) {
    return null;
  }
  const step = end < mode ? -1 : 1;
  let likelier = 0;
  let noLikelier = Math.abs(end - mode);
  while (noLikelier - likelier > 1) {
    const middle = Math.floor((likelier + noLikelier) / 2);
    if (isNoLikelier(mode + step * middle)) {
      noLikelier = middle;
    } else {
      likelier = middle;
    }
  }
  const modeTies = mode !== observed && likelier === 0 && isNoLikelier(mode);
  return modeTies ? mode : mode + step * noLikelier;
}

/** Probability of `start` and of everything from there to `end`, by ratios of neighbours. */
function tail(start: number, end: number, urn: Urn): number {
  const step = end < start ? -1 : 1;
  let relative = 1;
  let total = 1;
  for (let count = start; count !== end; count += step) {
    relative *= step > 0 ? ratioUp(count, urn) : 1 / ratioUp(count - 1, urn);
    const next = total + relative;
    if (next === total && relative < 1) {
      break;
    }
    total = next;
  }
  return Math.exp(logHypergeometric(start, urn)) * total;
}

/** Probability of count + 1 over that of count. */
function ratioUp(count: number, { marked, unmarked, drawn }: Urn): number {
  return ((marked - count) / (count + 1)) * ((drawn - count) / (unmarked - drawn + count + 1));
}
