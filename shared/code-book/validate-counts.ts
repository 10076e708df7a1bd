import type { CodeBookColumn } from './code-book';
import { refusal, type CodeBookFinding, type CodeBookFindingCode } from './finding';
import { isCount, parseNumber, type DecimalMark } from './numerals';

/** The first value of a count column that can't be a count, as a finding; none when all can. */
export function validateCountValues(
  column: CodeBookColumn,
  path: string,
  values: readonly string[],
  decimalMark: DecimalMark,
): readonly CodeBookFinding[] {
  for (const value of values) {
    const fault = countFault(value, decimalMark);
    if (fault === null) continue;
    const message = `The count column "${column.label}" holds ${WORDS[fault](value)}.`;
    return [refusal(fault, message, { path, columnId: column.id, value })];
  }
  return [];
}

type CountFault = Extract<
  CodeBookFindingCode,
  'countBlank' | 'countNotNumber' | 'countNotWhole' | 'countNegative'
>;

const WORDS: Readonly<Record<CountFault, (value: string) => string>> = {
  countBlank: () => 'a blank, and a count has to be given in every row',
  countNotNumber: (value) => `"${value}", which is no number`,
  countNotWhole: (value) => `${value}, and counts are whole numbers`,
  countNegative: (value) => `${value}, and a count cannot be negative`,
};

/** Why a value can't be a count; null when it can. */
export function countFault(value: string, decimalMark: DecimalMark): CountFault | null {
  if (value.trim() === '') return 'countBlank';
  const number = parseNumber(value, decimalMark);
  if (number === null) return 'countNotNumber';
  if (number < 0) return 'countNegative';
  return isCount(number) ? null : 'countNotWhole';
}
