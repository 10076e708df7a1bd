import type { HouseStyle } from '#shared/house-style';
import { MINUS, NO_BREAK_SPACE } from './number-text';

/** "95% CI" or "95% confidence interval", for a confidence level between 0 and 1. */
export function intervalLabel(level: number, style: HouseStyle): string {
  const words = style.interval.label === 'abbreviated' ? 'CI' : 'confidence interval';
  return levelPercent(level, style) + NO_BREAK_SPACE + words;
}

/** A confidence level as "95%" or "99.9%". */
export function levelPercent(level: number, style: HouseStyle): string {
  const percent = String(Number((level * 100).toPrecision(12)));
  return `${percent.replace('.', style.numbers.decimalMark)}%`;
}

/**
 * What stands between two limits: " to ", an en dash or ", ". A dash never stands beside a minus
 * sign, and a comma never beside a decimal comma.
 */
export function limitSeparator(lower: string, upper: string, style: HouseStyle): string {
  const { separator } = style.interval;
  if (separator === 'comma') {
    return style.numbers.decimalMark === ',' ? '; ' : ', ';
  }
  const hasMinus = lower.startsWith(MINUS) || upper.startsWith(MINUS);
  return separator === 'enDash' && !hasMinus ? '–' : ' to ';
}

/** Two printed limits: "9.7 to 23.4", "9.7–23.4", "9.7, 23.4". */
export function joinLimits(lower: string, upper: string, style: HouseStyle): string {
  return lower + limitSeparator(lower, upper, style) + upper;
}

/** The brackets round limits, in a sentence or behind an estimate in a table cell. */
export function limitBrackets(
  place: 'sentence' | 'table',
  { interval }: HouseStyle,
): { readonly open: string; readonly close: string } {
  const kind = place === 'sentence' ? interval.sentenceBrackets : interval.tableBrackets;
  return BRACKETS[kind];
}

const BRACKETS = {
  none: { open: '', close: '' },
  round: { open: '(', close: ')' },
  square: { open: '[', close: ']' },
} as const;
