import type { Run } from '#shared/layout';
import { fillWords } from '#shared/wording';
import { abbreviationsInTexts } from '../compose/abbreviations';
import type { BlockContext } from './block-context';
import { wordsRun } from './table-cells';

/** The note that writes out the abbreviations of these texts, alphabetical; none without any. */
export function abbreviationNote(
  texts: readonly string[],
  { blockId, phrasebook }: Pick<BlockContext, 'blockId' | 'phrasebook'>,
): readonly (readonly Run[])[] {
  const used = abbreviationsInTexts(texts, phrasebook);
  if (used.length === 0) return [];
  const entries = used.map(({ short, long }) =>
    fillWords(phrasebook, 'note.abbreviation', { short, long }),
  );
  const separator = fillWords(phrasebook, 'list.semicolon', {});
  return [[wordsRun(`${entries.join(separator)}.`, blockId)]];
}
