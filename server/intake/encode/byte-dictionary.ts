/* eslint-disable @typescript-eslint/no-non-null-assertion --
   Every index is below a length; checking each again would slow down every cell of a file. */

/** Start and factor of the hash (FNV-1a) that cells are found by. */
export const HASH_SEED = 0x811c9dc5 | 0;
export const HASH_FACTOR = 0x01000193;

/** The hash of some bytes, as `ByteDictionary` expects it. */
export function hashBytes(bytes: Uint8Array, from: number, to: number): number {
  let hash = HASH_SEED;
  for (let at = from; at < to; at += 1) hash = Math.imul(hash ^ bytes[at]!, HASH_FACTOR);
  return hash;
}

/** Rows of a batch. */
export const BATCH_ROWS = 256;

/** Cells of some rows, column by column: `BATCH_ROWS` places for each column. */
export interface CellBatch {
  readonly bytes: Uint8Array;
  readonly starts: Int32Array;
  readonly ends: Int32Array;
  readonly hashes: Int32Array;
  readonly rows: number;
}

/**
 * The distinct values of a column, numbered in order of first appearance.
 *
 * Values are kept as bytes one after the other, never as strings: a column of a million different
 * values would otherwise make a million strings.
 */
export class ByteDictionary {
  /** Number of distinct values. */
  size = 0;
  /** Number of rows that hold each value. */
  counts = new Uint32Array(64);
  private bytes = new Uint8Array(1024);
  private ends = new Uint32Array(64);
  private hashes = new Int32Array(64);
  private slots = new Int32Array(256).fill(-1);

  /** The number of a value, new or known, whose hash is `hash`; counts one more row for it. */
  add(source: Uint8Array, from: number, to: number, hash: number): number {
    const code = this.find(source, from, to, hash);
    this.counts[code]! += 1;
    return code;
  }

  /** The numbers of the values of a column's cells in a batch, row by row, into `codes`. */
  addAll(batch: CellBatch, column: number, codes: Uint32Array): void {
    const { bytes, starts, ends, hashes, rows } = batch;
    let { slots, counts, hashes: known } = this;
    const first = column * BATCH_ROWS;
    for (let row = 0; row < rows; row += 1) {
      const cell = first + row;
      const hash = hashes[cell]!;
      let code = slots[spread(hash) & (slots.length - 1)]!;
      if (
        code < 0 ||
        known[code] !== hash ||
        !this.equals(code, bytes, starts[cell]!, ends[cell]!)
      ) {
        code = this.find(bytes, starts[cell]!, ends[cell]!, hash);
        ({ slots, counts, hashes: known } = this);
      }
      counts[code]! += 1;
      codes[row] = code;
    }
  }

  /** Bytes that the values take up together. */
  get byteLength(): number {
    return this.size === 0 ? 0 : this.ends[this.size - 1]!;
  }

  /** The bytes of a value; not to be kept, since they move when the dictionary grows. */
  valueAt(code: number): Uint8Array {
    return this.valuesFrom(code, code + 1);
  }

  /** The bytes of the values from one code up to, without, another, one after the other. */
  valuesFrom(from: number, to: number): Uint8Array {
    return this.bytes.subarray(this.startOf(from), this.startOf(to));
  }

  /** Length in bytes of a value. */
  lengthAt(code: number): number {
    return this.startOf(code + 1) - this.startOf(code);
  }

  /** Where a value begins among all bytes, and where the one before it ends. */
  startOf(code: number): number {
    return code === 0 ? 0 : this.ends[code - 1]!;
  }

  /** The bytes of all values, with room behind them; to be looked at, not kept. */
  get allBytes(): Uint8Array {
    return this.bytes;
  }

  private find(source: Uint8Array, from: number, to: number, hash: number): number {
    const { slots, hashes } = this;
    const mask = slots.length - 1;
    let slot = spread(hash) & mask;
    for (;;) {
      const code = slots[slot]!;
      if (code < 0) return this.insert(source, from, to, hash, slot);
      if (hashes[code] === hash && this.equals(code, source, from, to)) return code;
      slot = (slot + 1) & mask;
    }
  }

  private equals(code: number, source: Uint8Array, from: number, to: number): boolean {
    const { bytes, ends } = this;
    let at = code === 0 ? 0 : ends[code - 1]!;
    if (ends[code]! - at !== to - from) return false;
    for (let other = from; other < to; other += 1, at += 1) {
      if (bytes[at] !== source[other]) return false;
    }
    return true;
  }

  private insert(source: Uint8Array, from: number, to: number, hash: number, slot: number): number {
    const code = this.size;
    const start = this.byteLength;
    const end = start + to - from;
    if (code === this.ends.length) this.growValues();
    if (end > this.bytes.length) this.growBytes(end);
    copyBytes(source, from, to, this.bytes, start);
    this.ends[code] = end;
    this.hashes[code] = hash;
    this.counts[code] = 0;
    this.slots[slot] = code;
    this.size = code + 1;
    if (this.size * 2 > this.slots.length) this.growSlots();
    return code;
  }

  private growValues(): void {
    const length = this.ends.length * 2;
    this.ends = grown(new Uint32Array(length), this.ends);
    this.counts = grown(new Uint32Array(length), this.counts);
    this.hashes = grown(new Int32Array(length), this.hashes);
  }

  private growBytes(needed: number): void {
    this.bytes = grown(new Uint8Array(Math.max(needed, this.bytes.length * 2)), this.bytes);
  }

  private growSlots(): void {
    const slots = new Int32Array(this.slots.length * 2).fill(-1);
    const mask = slots.length - 1;
    for (let code = 0; code < this.size; code += 1) {
      let slot = spread(this.hashes[code]!) & mask;
      while (slots[slot]! >= 0) slot = (slot + 1) & mask;
      slots[slot] = code;
    }
    this.slots = slots;
  }
}

const SHORT = 64;

/** Copying a few bytes one by one is quicker than making a view of them. */
function copyBytes(
  source: Uint8Array,
  from: number,
  to: number,
  target: Uint8Array,
  start: number,
): void {
  if (to - from > SHORT) {
    target.set(source.subarray(from, to), start);
    return;
  }
  for (let at = from, put = start; at < to; at += 1, put += 1) target[put] = source[at]!;
}

/** The low bits of the hash change little between short values; the high ones join in. */
function spread(hash: number): number {
  return hash ^ (hash >>> 15);
}

function grown<Numbers extends Uint8Array | Uint32Array | Int32Array>(
  larger: Numbers,
  present: Numbers,
): Numbers {
  larger.set(present);
  return larger;
}
