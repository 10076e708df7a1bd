import { ORDERED_WORDS, WORDS_FOR_NONE } from './ordered-words';

/**
 * Why codes were put in the order they have: by the numbers or bounds that all (`bounds`,
 * `numbers`) or some (`partly`) of them state, as words of a known scale, as letters, or not at
 * all (`appearance`).
 */
export type OrderGround = 'bounds' | 'numbers' | 'words' | 'letters' | 'partly' | 'appearance';

/** Codes in their natural order, and what that order rests on. */
export interface OrderedCodes {
  readonly codes: readonly string[];
  readonly ground: OrderGround;
}

/** The span that a label states; a single number has equal ends. */
interface Span {
  readonly lower: number;
  readonly upper: number;
  readonly plain: boolean;
}

/**
 * Puts the codes of a category into their natural order.
 *
 * Takes the distinct codes in order of first appearance. Labels that state numbers or bounds
 * ("0-39 g/day", "120+", "< 18", "3rd") go by those numbers, so that "120+" follows "80-119";
 * other labels keep the order of first appearance.
 */
export function orderCodes(codes: readonly string[]): OrderedCodes {
  if (codes.length < 2) return { codes, ground: 'appearance' };
  return byWords(codes) ?? byLetters(codes) ?? bySpans(codes) ?? { codes, ground: 'appearance' };
}

function byWords(codes: readonly string[]): OrderedCodes | null {
  const words = codes.map((code) => code.trim().toLowerCase());
  const scale = ORDERED_WORDS.find((known) => words.every((word) => known.includes(word)));
  if (scale === undefined || codes.length < 3) return null;
  return {
    codes: sortBy(codes, (code) => [scale.indexOf(code.trim().toLowerCase())]),
    ground: 'words',
  };
}

function byLetters(codes: readonly string[]): OrderedCodes | null {
  if (!codes.every((code) => /^[A-Za-z]$/.test(code.trim()))) return null;
  return { codes: sortBy(codes, (code) => [code.trim().charCodeAt(0)]), ground: 'letters' };
}

function bySpans(codes: readonly string[]): OrderedCodes | null {
  const prefix = sharedPrefix(codes);
  const spans = new Map(codes.map((code) => [code, spanOf(code.slice(prefix.length))]));
  const found = [...spans.values()].filter((span) => span !== null);
  const numbers = found.filter(({ upper }) => upper > -Infinity).length;
  if (numbers < 2 || numbers * 2 < codes.length) return null;
  const sorted = sortBy(codes, (code) => {
    const span = spans.get(code);
    return span ? [span.lower, span.upper] : [Infinity, Infinity];
  });
  return { codes: sorted, ground: groundOf(found, codes.length, prefix) };
}

function groundOf(found: readonly Span[], codes: number, prefix: string): OrderGround {
  if (found.length < codes) return 'partly';
  return prefix !== '' || found.every((span) => span.plain) ? 'numbers' : 'bounds';
}

/** The words before the number when every code begins with the same ones, as in "Site 12". */
function sharedPrefix(codes: readonly string[]): string {
  const prefix = /^[A-Za-z][A-Za-z _.-]*?(?=\s*\d)/.exec(codes[0] ?? '')?.[0] ?? '';
  return codes.every((code) => code.startsWith(prefix)) && !isComparison(prefix) ? prefix : '';
}

function isComparison(prefix: string): boolean {
  return /^(under|below|less than|fewer than|up to|at most|over|above|more than|at least)/i.test(
    prefix,
  );
}

const NUMBER = '(-?\\d+(?:[.,]\\d+)?)';
const BELOW = new RegExp(`^(?:<=?|≤|under|below|less than|fewer than|up to|at most)\\s*${NUMBER}`);
const ABOVE = new RegExp(`^(?:>=?|≥|over|above|more than|at least|from)\\s*${NUMBER}`);
const ONWARDS = new RegExp(`^${NUMBER}[^\\d+]*?(?:\\+|(?:and|or)\\s+(?:over|above|more|older|up))`);
const RANGE = new RegExp(`^${NUMBER}[^\\d-]*?\\s*(?:-|to|<)\\s*<?\\s*${NUMBER.replace('-?', '')}`);
const SINGLE = new RegExp(`^${NUMBER}(st|nd|rd|th)?(?![\\d.,])[^\\d]*$`);

const LONGEST_LABEL = 60;

function spanOf(label: string): Span | null {
  if (label.length > LONGEST_LABEL) return null;
  const text = label
    .trim()
    .toLowerCase()
    .replace(/[\u2010-\u2015\u2212]/g, '-');
  if (WORDS_FOR_NONE.includes(text)) return { lower: -Infinity, upper: -Infinity, plain: false };
  return boundedSpan(text) ?? singleSpan(text);
}

function boundedSpan(text: string): Span | null {
  const below = BELOW.exec(text);
  if (below) return { lower: -Infinity, upper: toNumber(below[1]), plain: false };
  const above = ABOVE.exec(text) ?? ONWARDS.exec(text);
  if (above) return { lower: toNumber(above[1]), upper: Infinity, plain: false };
  const range = RANGE.exec(text);
  if (!range) return null;
  const [lower, upper] = [toNumber(range[1]), toNumber(range[2])];
  return lower <= upper ? { lower, upper, plain: false } : null;
}

function singleSpan(text: string): Span | null {
  const single = SINGLE.exec(text);
  if (!single) return null;
  const value = toNumber(single[1]);
  return { lower: value, upper: value, plain: single[2] === undefined };
}

function toNumber(text: string | undefined): number {
  return Number((text ?? '').replace(',', '.'));
}

/** Sorts by keys of numbers; equal keys keep their order. */
function sortBy(
  codes: readonly string[],
  keysOf: (code: string) => readonly number[],
): readonly string[] {
  return [...codes].sort((one, other) => compareKeys(keysOf(one), keysOf(other)));
}

function compareKeys(one: readonly number[], other: readonly number[]): number {
  const at = one.findIndex((key, index) => key !== other[index]);
  if (at < 0) return 0;
  return (one[at] ?? 0) < (other[at] ?? 0) ? -1 : 1;
}
