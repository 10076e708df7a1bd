import { criticalValue, normalUpperTail } from '#shared/stats';
import { finding } from './finding';
import type { OutsideFinding } from './finding';
import { outsideNullValue } from './outside-estimate';
import type { OutsideEstimateEntry, OutsideMeasureId } from './outside-estimate';
import { readPrintedNumber, readPrintedPValue } from './printed-number';
import type { PrintedNumber, PrintedPValue } from './printed-number';

/** What the numbers of an entry are, when all of them can be read. */
export interface OutsideNumbers {
  readonly value: PrintedNumber;
  readonly lower: PrintedNumber;
  readonly upper: PrintedNumber;
}

type Numbered = Pick<OutsideEstimateEntry, 'measure' | 'value' | 'lower' | 'upper'>;

/** The estimate and its limits as numbers; null where one of them can't be read. */
export function readOutsideNumbers(entry: Numbered): OutsideNumbers | null {
  const value = readPrintedNumber(entry.value);
  const lower = readPrintedNumber(entry.lower);
  const upper = readPrintedNumber(entry.upper);
  return value && lower && upper ? { value, lower, upper } : null;
}

/**
 * Checks the numbers of an estimate against each other: they can be read, limits hold the estimate,
 * lie as far above it as below it on its scale (logarithmic for ratios), and give the p-value. Each
 * comparison allows for all that rounding can have done to the digits as they were entered.
 */
export function checkNumbers(
  entry: Numbered & Pick<OutsideEstimateEntry, 'level' | 'pValue'>,
): readonly OutsideFinding[] {
  const unreadable = findUnreadable(entry);
  const numbers = readOutsideNumbers(entry);
  if (numbers === null) {
    return unreadable;
  }
  const { value, lower, upper } = numbers;
  const isRatio = outsideNullValue(entry.measure) === 1;
  if (isRatio && [value, lower, upper].some((number) => number.value <= 0)) {
    return [...unreadable, finding('ratioNotPositive')];
  }
  const misplaced = findMisplaced(entry, numbers);
  return misplaced.length > 0
    ? [...unreadable, ...misplaced]
    : [...unreadable, ...findAsymmetry(entry, numbers), ...findOtherP(entry, numbers)];
}

function findUnreadable(
  entry: Numbered & Pick<OutsideEstimateEntry, 'pValue'>,
): readonly OutsideFinding[] {
  const fields = ['value', 'lower', 'upper'] as const;
  const unread = fields.filter((field) => readPrintedNumber(entry[field]) === null);
  const pUnread = entry.pValue !== null && readPrintedPValue(entry.pValue) === null;
  return [
    ...unread.map((field) => finding('numberNotReadable', { field, text: entry[field] })),
    ...(pUnread ? [finding('pValueNotReadable', { text: entry.pValue })] : []),
  ];
}

function findMisplaced(
  { value: valueText, lower: lowerText, upper: upperText }: Numbered,
  { value, lower, upper }: OutsideNumbers,
): readonly OutsideFinding[] {
  const facts = { value: valueText, lower: lowerText, upper: upperText };
  if (lower.value > upper.value) {
    return [finding('limitsReversed', facts)];
  }
  const held = lower.value <= value.value && value.value <= upper.value;
  return held ? [] : [finding('limitsWithoutValue', facts)];
}

/** Twice the estimate against the sum of its limits, each with its room for rounding. */
function findAsymmetry({ measure }: Numbered, numbers: OutsideNumbers): readonly OutsideFinding[] {
  const [value, lower, upper] = [numbers.value, numbers.lower, numbers.upper].map((number) =>
    onScale(measure, number),
  ) as [Range, Range, Range];
  const least = lower.lowest + upper.lowest;
  const most = lower.highest + upper.highest;
  if (2 * value.highest >= least - SLACK && 2 * value.lowest <= most + SLACK) {
    return [];
  }
  const middle = (scaled(measure, numbers.lower.value) + scaled(measure, numbers.upper.value)) / 2;
  const facts = { middle: unscaled(measure, middle), decimals: numbers.value.decimals };
  return [finding('notSymmetric', facts)];
}

/** The p-value of Wald's test that the limits stand for, against the one that was entered. */
function findOtherP(
  { measure, level, pValue }: Numbered & Pick<OutsideEstimateEntry, 'level' | 'pValue'>,
  numbers: OutsideNumbers,
): readonly OutsideFinding[] {
  const printed = pValue === null ? null : readPrintedPValue(pValue);
  if (printed === null || pValue === null) {
    return [];
  }
  const implied = impliedPValue(measure, level, numbers);
  const agrees = printed.highest >= implied.lowest && printed.lowest <= implied.highest;
  const facts = { pValue, lowest: implied.lowest, highest: implied.highest };
  return agrees ? [] : [finding('pDisagrees', facts)];
}

function impliedPValue(
  measure: OutsideMeasureId,
  level: number,
  numbers: OutsideNumbers,
): PrintedPValue {
  const [value, lower, upper] = [numbers.value, numbers.lower, numbers.upper].map((number) =>
    onScale(measure, number),
  ) as [Range, Range, Range];
  const critical = criticalValue(level);
  const widest = (upper.highest - lower.lowest) / (2 * critical);
  const narrowest = Math.max(0, upper.lowest - lower.highest) / (2 * critical);
  const holdsNull = value.lowest <= 0 && value.highest >= 0;
  const nearest = holdsNull ? 0 : Math.min(Math.abs(value.lowest), Math.abs(value.highest));
  const farthest = Math.max(Math.abs(value.lowest), Math.abs(value.highest));
  const lowest = narrowest === 0 ? 0 : 2 * normalUpperTail(farthest / narrowest);
  return { lowest, highest: 2 * normalUpperTail(nearest / widest) };
}

/** Absorbs what binary numbers do to decimal ones. */
const SLACK = 1e-9;

interface Range {
  readonly lowest: number;
  readonly highest: number;
}

/** Where a number can lie on the scale on which its limits are symmetric. */
function onScale(measure: OutsideMeasureId, { lowest, highest }: PrintedNumber): Range {
  return { lowest: scaled(measure, lowest), highest: scaled(measure, highest) };
}

/** Rounding can reach down to 0, whose logarithm is without bound. */
function scaled(measure: OutsideMeasureId, value: number): number {
  return outsideNullValue(measure) === 0 ? value : Math.log(Math.max(0, value));
}

function unscaled(measure: OutsideMeasureId, value: number): number {
  return outsideNullValue(measure) === 0 ? value : Math.exp(value);
}
