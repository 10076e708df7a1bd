/* eslint-disable @typescript-eslint/no-non-null-assertion --
   Every index is below a length; checking each again would slow down every cell of a file. */
import type { ScannedRow } from '../delimited/row-scanner';
import { BATCH_ROWS, type CellBatch } from './byte-dictionary';

/**
 * Gathers rows column by column, so that a column's cells are looked up one after the other, while
 * its dictionary is in the processor's cache. All rows of a batch lie in the same bytes.
 */
export class RowBatch implements CellBatch {
  bytes: Uint8Array = new Uint8Array();
  rows = 0;
  readonly starts: Int32Array;
  readonly ends: Int32Array;
  readonly hashes: Int32Array;
  /** The line of each row. */
  readonly lines = new Float64Array(BATCH_ROWS);

  constructor(columns: number) {
    this.starts = new Int32Array(columns * BATCH_ROWS);
    this.ends = new Int32Array(columns * BATCH_ROWS);
    this.hashes = new Int32Array(columns * BATCH_ROWS);
  }

  get full(): boolean {
    return this.rows === BATCH_ROWS;
  }

  /** Adds a row; the batch must not be full. */
  add({ bytes, starts, ends, hashes, count, line }: ScannedRow): void {
    this.bytes = bytes;
    this.lines[this.rows] = line;
    for (let cell = 0, at = this.rows; cell < count; cell += 1, at += BATCH_ROWS) {
      this.starts[at] = starts[cell]!;
      this.ends[at] = ends[cell]!;
      this.hashes[at] = hashes[cell]!;
    }
    this.rows += 1;
  }
}
