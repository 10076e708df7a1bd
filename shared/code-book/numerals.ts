/** The mark between the whole and the decimal part of a number, as a file writes it. */
export type DecimalMark = '.' | ',';

const NUMBER_WITH_POINT = /^[+\-\u2212]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?$/;
const NUMBER_WITH_COMMA = /^[+\-\u2212]?(?:\d+,?\d*|,\d+)(?:[eE][+-]?\d+)?$/;

/**
 * The number that a text stands for, or null when it is not a plain number.
 *
 * Blanks around it are ignored; thousands separators and units are not accepted. The sign may be
 * the typographic minus.
 */
export function parseNumber(text: string, decimalMark: DecimalMark): number | null {
  const trimmed = text.trim();
  const pattern = decimalMark === ',' ? NUMBER_WITH_COMMA : NUMBER_WITH_POINT;
  if (!pattern.test(trimmed)) return null;
  const value = Number(trimmed.replace(',', '.').replace('\u2212', '-'));
  return Number.isFinite(value) ? value : null;
}

/** Whether a number can be a count: whole, not negative, and exact (at most 2^53 − 1). */
export function isCount(value: number): boolean {
  return Number.isSafeInteger(value) && value >= 0;
}
