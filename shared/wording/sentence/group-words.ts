import { fillWords } from '../phrasebook/fill-pattern';
import type { Phrasebook } from '../phrasebook/phrasebook';

/** What names the people at a level of an exposure. */
export interface GroupNaming {
  readonly peopleNoun: string;
  readonly exposureSentenceLabel: string;
  /** The exposure column's pattern; null leaves it to the phrasebook. */
  readonly groupPattern: string | null;
}

/** Whether a group is named in full or, after the first, by "those" in place of the people. */
export type Mention = 'full' | 'those';

/**
 * The people at a level: "workers with over 6 hours of wet work", then "those with no wet work".
 *
 * "Those" stands only where the pattern begins with the people ("those male" is no English). A
 * pattern without {level} would name all groups alike, and is not used.
 */
export function groupWords(
  naming: GroupNaming,
  level: string,
  mention: Mention,
  book: Phrasebook,
): string {
  const pattern = patternOf(naming, book);
  const those = mention === 'those' && pattern.startsWith('{people}');
  const people = those ? fillWords(book, 'group.those', {}) : naming.peopleNoun;
  return pattern
    .split(/(\{people\}|\{level\})/)
    .map((piece) => (piece === '{people}' ? people : piece === '{level}' ? level : piece))
    .join('');
}

function patternOf(naming: GroupNaming, book: Phrasebook): string {
  return naming.groupPattern?.includes('{level}')
    ? naming.groupPattern
    : fillWords(book, 'group.default', {
        people: '{people}',
        exposure: naming.exposureSentenceLabel,
        level: '{level}',
      });
}
