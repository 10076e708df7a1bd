/* eslint-disable @typescript-eslint/no-non-null-assertion --
   Every code is below the size of the dictionary. */
import type { ValueCount } from '#shared/code-book';
import type { ByteDictionary } from '../encode/byte-dictionary';
import { readNumber } from '../encode/byte-numbers';
import { decodeText, type TextEncoding } from '../encode/encoding-watch';
import { NumberGatherer } from './number-totals';

/** Values of a column that its profile lists at most. */
export const LISTED_VALUES = 1000;

/** Longer texts are no codes; the profile leaves them out. */
const LONGEST_LISTED = 1000;

/** What a column holds, before the decimal mark of the file is known. */
export interface ColumnSummary {
  readonly distinct: number;
  readonly blank: number;
  readonly numbers: NumberGatherer;
  readonly values: readonly ValueCount[];
  readonly truncated: boolean;
}

/** Sums up a column from its distinct values. */
export function summarizeColumn(dictionary: ByteDictionary, encoding: TextEncoding): ColumnSummary {
  const numbers = new NumberGatherer();
  let blank = 0;
  let distinct = 0;
  const bytes = dictionary.allBytes;
  for (let code = 0; code < dictionary.size; code += 1) {
    const rows = dictionary.counts[code]!;
    const from = dictionary.startOf(code);
    const to = dictionary.startOf(code + 1);
    if (isBlank(bytes, from, to, encoding)) {
      blank += rows;
      continue;
    }
    distinct += 1;
    const number = readNumber(bytes, from, to);
    if (number !== null) numbers.add(number, rows);
  }
  return { distinct, blank, numbers, ...listedValues(dictionary, encoding) };
}

function isBlank(bytes: Uint8Array, from: number, to: number, encoding: TextEncoding): boolean {
  if (from === to) return true;
  const first = bytes[from]!;
  if (first > 0x20 && first < 0x80) return false;
  return decodeText(bytes.subarray(from, to), encoding).trim() === '';
}

/** The commonest values, in order of first appearance. */
function listedValues(
  dictionary: ByteDictionary,
  encoding: TextEncoding,
): Pick<ColumnSummary, 'values' | 'truncated'> {
  const codes = commonestCodes(dictionary);
  const values = [...codes]
    .map((code) => ({
      value: decodeText(dictionary.valueAt(code), encoding),
      count: dictionary.counts[code]!,
    }))
    .filter(({ value }) => value.length <= LONGEST_LISTED);
  return { values, truncated: values.length < dictionary.size };
}

function commonestCodes(dictionary: ByteDictionary): readonly number[] {
  const { size } = dictionary;
  if (size <= LISTED_VALUES) return Array.from({ length: size }, (_, code) => code);
  const counts = dictionary.counts.subarray(0, size);
  const threshold = counts.slice().sort()[size - LISTED_VALUES]!;
  const above = codesWhere(counts, (count) => count > threshold, LISTED_VALUES);
  const level = codesWhere(counts, (count) => count === threshold, LISTED_VALUES - above.length);
  return [...above, ...level].sort((one, other) => one - other);
}

function codesWhere(
  counts: Uint32Array,
  wanted: (count: number) => boolean,
  most: number,
): readonly number[] {
  const codes: number[] = [];
  for (let code = 0; code < counts.length && codes.length < most; code += 1) {
    if (wanted(counts[code]!)) codes.push(code);
  }
  return codes;
}
