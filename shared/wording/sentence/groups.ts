import { fillPattern, fillWords } from '../phrasebook/fill-pattern';
import type { ClaimGroup } from '../claim';
import type { PhrasePart } from '../phrase';
import { countInBrackets } from './counts';
import type { WordingContext } from './wording-context';

/** Whether a group is named in full or, after the first, by "those" in place of the people. */
export type Mention = 'full' | 'those';

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
    text: groupWords(context, level.sentenceLabel, mention),
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

function groupWords({ claim, book }: WordingContext, level: string, mention: Mention): string {
  const own = claim.groupPattern?.includes('{level}') ? claim.groupPattern : null;
  const pattern =
    own ??
    fillWords(book, 'group.default', {
      people: '{people}',
      exposure: claim.exposureSentenceLabel,
      level: '{level}',
    });
  const those = mention === 'those' && pattern.startsWith('{people}');
  const people = those ? fillWords(book, 'group.those', {}) : claim.peopleNoun;
  return pattern
    .split(/(\{people\}|\{level\})/)
    .map((piece) => (piece === '{people}' ? people : piece === '{level}' ? level : piece))
    .join('');
}
