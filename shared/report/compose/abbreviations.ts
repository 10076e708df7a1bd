import type { Phrasebook } from '#shared/wording';

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
  return Object.entries(book.abbreviations)
    .filter(([short]) => texts.some((text) => holdsWord(text, short)))
    .map(([short, long]) => ({ short, long }))
    .toSorted((one, other) => (one.short < other.short ? -1 : 1));
}

/** Each of these abbreviations once, alphabetical. */
export function mergeAbbreviations(
  lists: readonly (readonly Abbreviation[])[],
): readonly Abbreviation[] {
  const merged = new Map(lists.flat().map((one) => [one.short, one]));
  return [...merged.values()].toSorted((one, other) => (one.short < other.short ? -1 : 1));
}

function holdsWord(text: string, word: string): boolean {
  for (let from = text.indexOf(word); from !== -1; from = text.indexOf(word, from + 1)) {
    const [before, after] = [text.charAt(from - 1), text.charAt(from + word.length)];
    if (!isWordCharacter(before) && !isWordCharacter(after)) return true;
  }
  return false;
}

function isWordCharacter(character: string): boolean {
  return /^[\p{L}\p{N}]/u.test(character);
}

/**
 * Splits generated words at their abbreviations, so that the first use can be written out: each
 * abbreviation becomes a piece of its own that names it.
 */
export function markAbbreviations<Words extends { readonly text: string }>(
  words: Words,
  book: Phrasebook,
): readonly (Words & { readonly abbreviation?: string })[] {
  if (!/[A-Z]{2}/u.test(words.text)) return [words];
  const parts = words.text.split(/(?<![\p{L}\p{N}])([A-Z]{2,})(?![\p{L}\p{N}])/u);
  return parts
    .filter((text) => text !== '')
    .map((text) =>
      Object.hasOwn(book.abbreviations, text)
        ? { ...words, text, abbreviation: text }
        : { ...words, text },
    );
}
