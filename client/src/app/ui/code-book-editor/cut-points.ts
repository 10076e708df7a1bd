import { type DecimalMark, parseNumber, type ProfiledColumn } from '#shared/code-book';
import { failure, type Result, success } from '#shared/core';

/** Reads cut points as a person types them: numbers between spaces, semicolons or commas. */
export function parsedCutPoints(text: string): Result<readonly number[], string> {
  const words = text.split(/[\s;,]+/).filter((word) => word !== '');
  const numbers = words.map((word) => parseNumber(word, '.'));
  const wrong = words.find((_, at) => numbers[at] === null);
  if (wrong !== undefined) return failure(`"${wrong}" is not a number. Write 40, 60, 75.`);
  return success(numbers.filter((number) => number !== null));
}

/** How the numbers of a column come; what the profile does not list may be any number. */
export function grainOf(
  contents: ProfiledColumn | null,
  decimalMark: DecimalMark,
): 'wholeNumbers' | 'anyNumbers' {
  const numbers = contents?.values
    .map(({ value }) => parseNumber(value, decimalMark))
    .filter((number) => number !== null);
  const whole = numbers !== undefined && numbers.length > 0 && numbers.every(Number.isInteger);
  return whole ? 'wholeNumbers' : 'anyNumbers';
}
