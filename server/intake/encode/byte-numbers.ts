/* eslint-disable @typescript-eslint/no-non-null-assertion --
   Every index is below a length. */
import { parseNumber } from '#shared/code-book';

/** How a number is written: without decimals, or with which mark. */
export type NumberWriting = 'whole' | 'point' | 'comma';

/** A number read from bytes. `grouped` marks three digits after the mark, as in "1,234". */
export interface ReadNumber {
  readonly writing: NumberWriting;
  readonly value: number;
  readonly grouped: boolean;
}

const MOST_EXACT_DIGITS = 15;

/**
 * Reads a number from the bytes of a value, with either decimal mark; null when it is none.
 *
 * Plain numbers of up to 15 digits are read from the bytes (exactly: both parts of the division
 * are exact); everything else goes the way of `parseNumber`, which decides.
 */
export function readNumber(
  bytes: Uint8Array,
  from = 0,
  to: number = bytes.length,
): ReadNumber | null {
  let at = bytes[from] === 0x2d || bytes[from] === 0x2b ? from + 1 : from;
  let digits = 0;
  let mark = -1;
  let number = 0;
  for (; at < to; at += 1) {
    const byte = bytes[at]!;
    if (byte >= 0x30 && byte <= 0x39) {
      number = number * 10 + (byte - 0x30);
      digits += 1;
    } else if ((byte === 0x2e || byte === 0x2c) && mark < 0) mark = at;
    else return mayBeNumber(byte) ? readText(bytes.subarray(from, to)) : null;
  }
  if (digits === 0) return null;
  if (digits > MOST_EXACT_DIGITS) return readText(bytes.subarray(from, to));
  const decimals = mark < 0 ? 0 : to - mark - 1;
  const size = number / 10 ** decimals;
  const value = bytes[from] === 0x2d ? -size : size;
  if (mark < 0) return { writing: 'whole', value, grouped: false };
  const writing = bytes[mark] === 0x2c ? 'comma' : 'point';
  return { writing, value, grouped: decimals === 3 && bytes[from] !== 0x30 && mark > from };
}

/** Blanks, characters beyond ASCII and exponents are left to the reading of text. */
function mayBeNumber(byte: number): boolean {
  return byte <= 0x20 || byte > 0x7f || byte === 0x65 || byte === 0x45;
}

function readText(bytes: Uint8Array): ReadNumber | null {
  const text = Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength).toString('utf8');
  const withPoint = parseNumber(text, '.');
  const value = withPoint ?? parseNumber(text, ',');
  if (value === null) return null;
  if (withPoint === null) return { writing: 'comma', value, grouped: false };
  return { writing: text.includes('.') ? 'point' : 'whole', value, grouped: false };
}
