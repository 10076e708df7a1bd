import { capitalised, fillWords } from '../phrasebook/fill-pattern';
import type { Phrasebook } from '../phrasebook/phrasebook';

/** What a picker in the contrast sentence picks. */
export type ContrastSlot = 'outcome' | 'exposure' | 'reference' | 'strata';

/** One part of the contrast sentence: words, or the place of a picker with its present words. */
export type ContrastPart =
  | { readonly kind: 'text'; readonly text: string }
  | { readonly kind: 'picker'; readonly slot: ContrastSlot; readonly text: string };

/** What is picked, or what stands in its place until something is. */
export interface ContrastWords {
  readonly outcome: string;
  readonly timeFrame: string | null;
  readonly exposure: string;
  readonly reference: string;
  /** The stratifying columns, as in "sex and class"; null without strata. */
  readonly strata: string | null;
}

/**
 * The analysis as a sentence with pickers for words: "Hand eczema within 12 months by wet work per
 * shift, each level against no wet work, within workplace".
 */
export function contrastSentence(words: ContrastWords, book: Phrasebook): readonly ContrastPart[] {
  const { timeFrame } = words;
  const picked = pickerWords(words, book);
  const pattern = fillWords(book, 'contrast.sentence', {
    outcome: '{outcome}',
    time: timeFrame === null ? '' : fillWords(book, 'contrast.time', { time: timeFrame }),
    exposure: '{exposure}',
    reference: '{reference}',
    strata: '{strata}',
  });
  return pattern
    .split(/(\{(?:outcome|exposure|reference|strata)\})/)
    .filter((piece) => piece !== '')
    .map((piece) => partOf(piece, picked));
}

type PickerWords = Readonly<Record<ContrastSlot, string>>;

function pickerWords(words: ContrastWords, book: Phrasebook): PickerWords {
  const { outcome, exposure, reference, strata } = words;
  return {
    outcome: capitalised(outcome),
    exposure,
    reference,
    strata:
      strata === null
        ? fillWords(book, 'contrast.noStrata', {})
        : fillWords(book, 'contrast.within', { strata }),
  };
}

function partOf(piece: string, words: PickerWords): ContrastPart {
  const slot = SLOTS.find((name) => piece === `{${name}}`);
  return slot === undefined
    ? { kind: 'text', text: piece }
    : { kind: 'picker', slot, text: words[slot] };
}

const SLOTS: readonly ContrastSlot[] = ['outcome', 'exposure', 'reference', 'strata'];
