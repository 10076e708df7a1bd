import { groupWords } from '../sentence/group-words';
import type { PrintContext } from './print-context';

/** The people at a level of the exposure, named in full as sentences name them. */
export function groupAt({ result, book }: PrintContext, levelId: string): string {
  const { frame } = result;
  const level = frame.exposure.levels.find(({ id }) => id === levelId);
  const naming = {
    peopleNoun: frame.peopleNoun,
    exposureSentenceLabel: frame.exposure.sentenceLabel,
    groupPattern: frame.exposure.groupPattern ?? null,
  };
  return groupWords(naming, level?.sentenceLabel ?? '', 'full', book);
}
