import type { LayoutElement } from '#shared/layout';
import type { Phrasebook } from '#shared/wording';
import { runsOf } from './element-runs';

/** An abbreviation with what it stands for. */
export interface Abbreviation {
  readonly short: string;
  readonly long: string;
}

/** "confidence interval (CI)", or "confidence interval [CI]" inside brackets. */
export function firstUseText(
  short: string,
  place: 'inBrackets' | 'inText',
  book: Phrasebook,
): string {
  const long = book.abbreviations[short] ?? short;
  return place === 'inBrackets' ? `${long} [${short}]` : `${long} (${short})`;
}

/** The abbreviations of the phrasebook that stand in these texts as words, alphabetical. */
export function abbreviationsInTexts(
  texts: readonly string[],
  book: Phrasebook,
): readonly Abbreviation[] {
  const words = new Set(texts.flatMap((text) => text.split(/[^\p{L}\p{N}]+/u)));
  return Object.entries(book.abbreviations)
    .filter(([short]) => words.has(short))
    .map(([short, long]) => ({ short, long }))
    .toSorted((one, other) => (one.short < other.short ? -1 : 1));
}

/** The abbreviations that a report uses anywhere, alphabetical. */
export function abbreviationsOf(
  elements: readonly LayoutElement[],
  textsOf: (element: LayoutElement) => readonly string[],
  book: Phrasebook,
): readonly Abbreviation[] {
  return abbreviationsInTexts(elements.flatMap(textsOf), book);
}

/**
 * Splits generated words at their abbreviations, so that the first use can be written out: each
 * abbreviation becomes a piece of its own that names it.
 */
export function markAbbreviations<Words extends { readonly text: string }>(
  words: Words,
  book: Phrasebook,
): readonly (Words & { readonly abbreviation?: string })[] {
  const parts = words.text.split(/(?<![\p{L}\p{N}])(\p{Lu}{2,})(?![\p{L}\p{N}])/u);
  return parts
    .filter((text) => text !== '')
    .map((text) =>
      Object.hasOwn(book.abbreviations, text)
        ? { ...words, text, abbreviation: text }
        : { ...words, text },
    );
}

/** The texts of an element's runs. */
export function textsOfElement(element: LayoutElement): readonly string[] {
  return runsOf(element).map(({ text }) => text);
}
