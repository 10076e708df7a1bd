/* eslint-disable @typescript-eslint/no-non-null-assertion --
   Every index is below a length; checking each again makes these loops a third slower. */
import type { Codes } from './encoded-cut';
import { BLOCK_ROWS, cellsOf, stridesOf, type CellCounter, type GridDigit } from './cell-grid';

/** With more cells than this, two cell numbers no longer fit side by side in one word. */
export const MOST_PACKED_CELLS = 65_536;

const WORDS = BLOCK_ROWS / 4;

/** Every other byte of a word: room for two cell numbers of 16 bits. */
const HALVES = 0x00ff00ff;

/**
 * Counts single records whose digits are all bytes, four rows at a time.
 *
 * A word holds the bytes of four rows; two multiplications a digit give the cell numbers of all
 * four, since none is over 16 bits. Four accumulators keep rows of one cell from waiting for each
 * other; rows that fill up the last word fall into the first cell and are taken off again. Takes
 * digits of at most 256 values that make at most `MOST_PACKED_CELLS` cells.
 */
export function createByteCounter(digits: readonly GridDigit[]): CellCounter {
  const cells = cellsOf(digits);
  const strides = stridesOf(digits);
  const counts = new Uint32Array(cells * 4);
  const [first, second] = [counts.subarray(0, cells), counts.subarray(cells, cells * 2)];
  const [third, fourth] = [counts.subarray(cells * 2, cells * 3), counts.subarray(cells * 3)];
  const block = createBlock();
  let padded = 0;

  function addBlock(from: number, to: number): void {
    const padding = (4 - ((to - from) % 4)) % 4;
    const words = (to - from + padding) / 4;
    digits.forEach((digit, at) => {
      const bytes = wordsOf(digit, from, to, block);
      if (at === 0) setDigit(block, bytes, words, strides[at] ?? 1);
      else addDigit(block, bytes, words, strides[at] ?? 1);
    });
    countWords(block, words, first, second, third, fourth);
    padded += padding;
  }

  return {
    add: (from, to) => {
      for (let at = from; at < to; at += BLOCK_ROWS) addBlock(at, Math.min(to, at + BLOCK_ROWS));
    },
    visit: (visit) => {
      for (let cell = 0; cell < cells; cell += 1) {
        const padding = cell === 0 ? padded : 0;
        const count = sumAt(cell, first, second, third, fourth) - padding;
        if (count !== 0) visit(cell, count);
      }
    },
  };
}

interface Block {
  readonly bytes: Uint8Array;
  readonly words: Uint32Array;
  /** Cell numbers of the rows in the even bytes of each word, and of those in the odd ones. */
  readonly even: Int32Array;
  readonly odd: Int32Array;
}

function createBlock(): Block {
  const bytes = new Uint8Array(BLOCK_ROWS);
  const words = new Uint32Array(bytes.buffer);
  return { bytes, words, even: new Int32Array(WORDS), odd: new Int32Array(WORDS) };
}

/** The bytes of a digit as words; rows are copied only where they don't lie as words already. */
function wordsOf({ codes, map }: GridDigit, from: number, to: number, block: Block): Uint32Array {
  const aligned = (codes.byteOffset + from) % 4 === 0 && (to - from) % 4 === 0;
  if (map === null && codes instanceof Uint8Array && aligned) {
    return new Uint32Array(codes.buffer, codes.byteOffset + from, (to - from) / 4);
  }
  if (map === null) block.bytes.set(codes.subarray(from, to));
  else mapRows(codes, map, from, to, block.bytes);
  block.bytes.fill(0, to - from, to - from + 3);
  return block.words;
}

function mapRows(
  codes: Codes,
  map: Uint32Array,
  from: number,
  to: number,
  bytes: Uint8Array,
): void {
  for (let row = from; row < to; row += 1) bytes[row - from] = map[codes[row]!]!;
}

function setDigit({ even, odd }: Block, words: Uint32Array, length: number, stride: number): void {
  for (let at = 0; at < length; at += 1) {
    const word = words[at]!;
    even[at] = Math.imul(word & HALVES, stride);
    odd[at] = Math.imul((word >>> 8) & HALVES, stride);
  }
}

function addDigit({ even, odd }: Block, words: Uint32Array, length: number, stride: number): void {
  for (let at = 0; at < length; at += 1) {
    const word = words[at]!;
    even[at] = even[at]! + Math.imul(word & HALVES, stride);
    odd[at] = odd[at]! + Math.imul((word >>> 8) & HALVES, stride);
  }
}

function countWords(
  { even, odd }: Block,
  length: number,
  first: Uint32Array,
  second: Uint32Array,
  third: Uint32Array,
  fourth: Uint32Array,
): void {
  for (let at = 0; at < length; at += 1) {
    const two = even[at]!;
    const others = odd[at]!;
    first[two & 0xffff]! += 1;
    second[others & 0xffff]! += 1;
    third[two >>> 16]! += 1;
    fourth[others >>> 16]! += 1;
  }
}

function sumAt(cell: number, ...parts: readonly Uint32Array[]): number {
  return parts.reduce((sum, part) => sum + (part[cell] ?? 0), 0);
}
