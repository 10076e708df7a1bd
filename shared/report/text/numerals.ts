/** A piece of text, and whether it is a number in digits. */
export interface TextPart {
  readonly text: string;
  readonly numeral: boolean;
}

/**
 * Digits with their sign, thousands and decimal marks and percent sign. Digits that hang on a
 * letter ("A1", "B12") are a name, not a number.
 */
const NUMERAL =
  /(?<![\p{L}\p{N}_])(?:(?<![\p{L}\p{N})\]])[+\u2212-])?\d+(?:[.,\u00b7\u2009\u202f]\d+)*(?:[\u00a0\u202f]?%)?(?!\p{L})/gu;

/** Splits text into numbers written in digits and the text between them; nothing is lost. */
export function splitNumerals(text: string): readonly TextPart[] {
  const parts: TextPart[] = [];
  let end = 0;
  for (const match of text.matchAll(NUMERAL)) {
    if (match.index > end) parts.push({ text: text.slice(end, match.index), numeral: false });
    parts.push({ text: match[0], numeral: true });
    end = match.index + match[0].length;
  }
  if (end < text.length) parts.push({ text: text.slice(end), numeral: false });
  return parts;
}

/** The numbers in digits that a text holds, in order. */
export function numeralsOf(text: string): readonly string[] {
  return [...text.matchAll(NUMERAL)].map((match) => match[0]);
}
