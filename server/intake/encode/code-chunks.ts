/* eslint-disable @typescript-eslint/no-non-null-assertion --
   Every index is below a length; checking each again would slow down every cell of a file. */
import type { ChunkSink } from './chunk';

const FIRST_CAPACITY = 1024;

/**
 * Gathers the codes of one column and gives them away in chunks of `chunkRows` rows.
 *
 * Each chunk is as narrow as its largest code allows: one, two or four bytes a row, little-endian.
 */
export class CodeChunks {
  /** Bytes of the widest code so far. */
  width = 1;
  private codes = new Uint32Array(FIRST_CAPACITY);
  private rows = 0;
  private chunk = 0;

  constructor(
    private readonly position: number,
    private readonly chunkRows: number,
    private readonly sink: ChunkSink,
  ) {}

  /** Takes the codes of the next rows: the first `rows` of `codes`. */
  add(codes: Uint32Array, rows: number): void {
    let taken = 0;
    while (taken < rows) {
      const some = Math.min(rows - taken, this.chunkRows - this.rows);
      this.makeRoom(this.rows + some);
      this.codes.set(codes.subarray(taken, taken + some), this.rows);
      this.rows += some;
      taken += some;
      if (this.rows === this.chunkRows) this.flush();
    }
  }

  /** Gives away what is gathered; at the end of the column. */
  flush(): void {
    if (this.rows === 0) return;
    const width = widthOf(largestOf(this.codes, this.rows));
    const bytes = packed(this.codes, this.rows, width);
    this.sink({ position: this.position, part: 'codes', chunk: this.chunk, bytes });
    this.width = Math.max(this.width, width);
    this.chunk += 1;
    this.rows = 0;
  }

  private makeRoom(rows: number): void {
    if (rows <= this.codes.length) return;
    const larger = new Uint32Array(Math.min(this.chunkRows, Math.max(rows, this.codes.length * 4)));
    larger.set(this.codes);
    this.codes = larger;
  }
}

function largestOf(codes: Uint32Array, rows: number): number {
  let largest = 0;
  for (let row = 0; row < rows; row += 1) if (codes[row]! > largest) largest = codes[row]!;
  return largest;
}

/** Bytes that codes up to `largest` need. */
function widthOf(largest: number): 1 | 2 | 4 {
  if (largest < 256) return 1;
  return largest < 65_536 ? 2 : 4;
}

function packed(codes: Uint32Array, rows: number, width: 1 | 2 | 4): Uint8Array<ArrayBuffer> {
  const bytes = new Uint8Array(rows * width);
  for (let row = 0, at = 0; row < rows; row += 1) {
    let code = codes[row]!;
    for (let byte = 0; byte < width; byte += 1, at += 1) {
      bytes[at] = code & 0xff;
      code >>>= 8;
    }
  }
  return bytes;
}
