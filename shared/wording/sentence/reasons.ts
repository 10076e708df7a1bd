import type { EffectMeasureId } from '#shared/effects';
import type { EstimationIssue } from '#shared/stats';
import { fillPattern, fillWords } from '../phrasebook/fill-pattern';
import type { PhrasePart } from '../phrase';
import { issueWords } from '../issue-words';
import { groupPart } from './groups';
import type { WordingContext } from './wording-context';

/** Why a measure of the claim is not estimable; follows "because". */
export function reasonOf(context: WordingContext, measure: EffectMeasureId): readonly PhrasePart[] {
  const { claim, book } = context;
  const estimate = claim.measures[measure];
  const issue: EstimationIssue = estimate.ok ? { code: 'invalidCounts' } : estimate.issue;
  if (claim.scope.kind !== 'pooled' && issue.code === 'emptyGroup') {
    return emptyGroupReason(context);
  }
  if (claim.scope.kind !== 'pooled' && issue.code === 'zeroCell' && measure === 'riskRatio') {
    return noEventsReason(context);
  }
  return [{ kind: 'text', text: issueWords(issue, book) }];
}

function emptyGroupReason(context: WordingContext): readonly PhrasePart[] {
  const { claim, book } = context;
  const empty = [claim.index, claim.reference].filter(({ count }) => count.total === 0);
  const [only] = empty;
  return only && empty.length === 1
    ? fillPattern(book, 'reason.emptyGroup', { group: groupPart(context, only, 'full') })
    : fillPattern(book, 'reason.bothEmpty', {});
}

function noEventsReason(context: WordingContext): readonly PhrasePart[] {
  const { claim, book } = context;
  const without = [claim.index, claim.reference].filter(({ count }) => count.events === 0);
  const [only] = without;
  if (!only) {
    return [{ kind: 'text', text: fillWords(book, 'issue.zeroCell', {}) }];
  }
  return without.length === 1
    ? fillPattern(book, 'reason.noEvents', { group: groupPart(context, only, 'full') })
    : fillPattern(book, 'reason.noEventsAtAll', {});
}
