/**
 * A number as somebody printed it, with what it can have been before it was rounded: from half a
 * unit of its last digit below to half a unit above.
 */
export interface PrintedNumber {
  readonly value: number;
  readonly lowest: number;
  readonly highest: number;
  readonly decimals: number;
}

const NUMBER = /^[+\-\u2212\u2013]?(?:\d{1,9}(?:\.\d{1,10})?|\.\d{1,10})$/;

/** Reads "1.50", "-4.2" or ".85"; null for what is no plain decimal number with a point. */
export function readPrintedNumber(text: string): PrintedNumber | null {
  const trimmed = text.trim();
  if (!NUMBER.test(trimmed)) {
    return null;
  }
  const plain = trimmed.replace(/^[\u2212\u2013]/, '-');
  const decimals = (plain.split('.')[1] ?? '').length;
  const value = Number(plain);
  const half = 0.5 * 10 ** -decimals;
  return { value, lowest: value - half, highest: value + half, decimals };
}

/** What a printed p-value can have been: a range within 0 and 1. */
export interface PrintedPValue {
  readonly lowest: number;
  readonly highest: number;
}

/** Reads "0.03", "<0.001" or ">0.99"; null for anything else, and for a p above 1. */
export function readPrintedPValue(text: string): PrintedPValue | null {
  const [, sign = '', figure = ''] =
    /^\s*(?:p\s*)?([<>=]?)\s*(\d?\.\d{1,10}|[01])\s*$/i.exec(text) ?? [];
  const printed = figure === '' ? null : readPrintedNumber(figure);
  if (printed === null || printed.value > 1) {
    return null;
  }
  if (sign === '<') {
    return { lowest: 0, highest: printed.value };
  }
  if (sign === '>') {
    return { lowest: printed.value, highest: 1 };
  }
  return { lowest: Math.max(0, printed.lowest), highest: Math.min(1, printed.highest) };
}
