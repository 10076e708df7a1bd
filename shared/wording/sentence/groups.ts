import { fillPattern } from '../phrasebook/fill-pattern';
import type { ClaimGroup } from '../claim';
import type { PhrasePart } from '../phrase';
import { countInBrackets } from './counts';
import { groupWords, type Mention } from './group-words';
import type { WordingContext } from './wording-context';

/**
 * The people of a group: "workers with over 6 hours of wet work", then "those with no wet work".
 * "Those" only where the pattern begins with the people ("those male" is no English).
 */
export function groupPart(
  context: WordingContext,
  { level }: ClaimGroup,
  mention: Mention,
): PhrasePart {
  return {
    kind: 'group',
    text: groupWords(context.claim, level.sentenceLabel, mention, context.book),
    levelId: level.id,
  };
}

/** A group with its count in brackets; a pooled claim gives the counts elsewhere. */
export function countedGroup(
  context: WordingContext,
  group: ClaimGroup,
  mention: Mention,
): readonly PhrasePart[] {
  const part = groupPart(context, group, mention);
  return context.claim.scope.kind === 'pooled'
    ? [part]
    : fillPattern(context.book, 'group.counted', {
        group: part,
        count: countInBrackets(context, group),
      });
}
