import type { ResultFrame } from '#shared/analysis';
import { capitalised, fillWords } from '../phrasebook/fill-pattern';
import type { Phrasebook } from '../phrasebook/phrasebook';

/** What a picker in the contrast sentence picks. */
export type ContrastSlot = 'outcome' | 'exposure' | 'reference' | 'strata';

/** One part of the contrast sentence: words, or the place of a picker with its present words. */
export type ContrastPart =
  | { readonly kind: 'text'; readonly text: string }
  | { readonly kind: 'picker'; readonly slot: ContrastSlot; readonly text: string };

/**
 * The analysis as a sentence with pickers for words: "Hand eczema within 12 months by wet work per
 * shift, each level against no wet work, within workplace".
 */
export function contrastSentence(frame: ResultFrame, book: Phrasebook): readonly ContrastPart[] {
  const words = pickerWords(frame, book);
  const time = frame.outcome.timeFrame;
  const pattern = fillWords(book, 'contrast.sentence', {
    outcome: '{outcome}',
    time: time === null ? '' : fillWords(book, 'contrast.time', { time }),
    exposure: '{exposure}',
    reference: '{reference}',
    strata: '{strata}',
  });
  return pattern
    .split(/(\{\w+\})/)
    .filter((piece) => piece !== '')
    .map((piece) => partOf(piece, words));
}

function pickerWords(
  { outcome, exposure, strata, strataLabel }: ResultFrame,
  book: Phrasebook,
): Readonly<Record<ContrastSlot, string>> {
  const reference = exposure.levels.find(({ id }) => id === exposure.referenceLevelId);
  const columns = strata[0]?.within?.map(({ columnLabel }) => columnLabel).join(' and ');
  const stratified = columns ?? strataLabel;
  return {
    outcome: capitalised(outcome.noun),
    exposure: exposure.sentenceLabel,
    reference: reference?.sentenceLabel ?? '',
    strata:
      stratified === null
        ? fillWords(book, 'contrast.noStrata', {})
        : fillWords(book, 'contrast.within', { strata: stratified }),
  };
}

function partOf(piece: string, words: Readonly<Record<ContrastSlot, string>>): ContrastPart {
  const slot = piece.slice(1, -1);
  return isSlot(slot) && piece.startsWith('{')
    ? { kind: 'picker', slot, text: words[slot] }
    : { kind: 'text', text: piece };
}

function isSlot(name: string): name is ContrastSlot {
  return ['outcome', 'exposure', 'reference', 'strata'].includes(name);
}
