/* eslint-disable @typescript-eslint/no-non-null-assertion --
   Every index is below a length. */
import type { ScannedRow } from '../delimited/row-scanner';
import { hashBytes } from '../encode/byte-dictionary';
import { LIMITS } from '../limits';

/** The columns that a table of a sheet takes up, counted from 0; `to` is the last one. */
export interface ColumnSpan {
  readonly from: number;
  readonly to: number;
}

/** Gathers the cells of one row of a sheet, by column, as bytes. */
export class RowBuilder {
  private bytes = Buffer.alloc(4096);
  private length = 0;
  private readonly starts = new Int32Array(LIMITS.columns + 1);
  private readonly ends = new Int32Array(LIMITS.columns + 1);
  private readonly hashes = new Int32Array(LIMITS.columns + 1);
  /** Where the bytes of the cell in each column of the sheet begin and end; begins −1: no cell. */
  private readonly cellStarts = new Int32Array(MOST_SHEET_COLUMNS).fill(-1);
  private readonly cellEnds = new Int32Array(MOST_SHEET_COLUMNS);
  private filled: number[] = [];

  /** Begins a new row. */
  clear(): void {
    for (const column of this.filled) this.cellStarts[column] = -1;
    this.filled = [];
    this.length = 0;
  }

  /** Sets the cell of a column; blank texts count as no cell. */
  set(column: number, text: Uint8Array | string): void {
    const most = typeof text === 'string' ? text.length * 3 : text.length;
    if (this.length + most > this.bytes.length) this.grow(this.length + most);
    const start = this.length;
    if (typeof text === 'string') this.length += this.bytes.write(text, start, 'utf8');
    else {
      this.bytes.set(text, start);
      this.length += text.length;
    }
    if (column >= MOST_SHEET_COLUMNS || isBlank(this.bytes, start, this.length)) return;
    this.cellStarts[column] = start;
    this.cellEnds[column] = this.length;
    this.filled.push(column);
  }

  /** The columns that hold something, none for a blank row. */
  get span(): ColumnSpan | null {
    if (this.filled.length === 0) return null;
    return { from: Math.min(...this.filled), to: Math.max(...this.filled) };
  }

  /** The first column outside a span that holds something; null when none does. */
  firstOutside({ from, to }: ColumnSpan): number | null {
    return this.filled.find((column) => column < from || column > to) ?? null;
  }

  /** The cells of a span as a row; columns without a cell are blank. */
  row({ from, to }: ColumnSpan, line: number): ScannedRow {
    const { bytes, starts, ends, hashes } = this;
    for (let column = from, cell = 0; column <= to; column += 1, cell += 1) {
      const start = Math.max(0, this.cellStarts[column]!);
      const end = this.cellStarts[column]! < 0 ? start : this.cellEnds[column]!;
      starts[cell] = start;
      ends[cell] = end;
      hashes[cell] = hashBytes(bytes, start, end);
    }
    return { bytes, starts, ends, hashes, count: to - from + 1, line };
  }

  private grow(needed: number): void {
    const bytes = Buffer.alloc(Math.max(needed, this.bytes.length * 2));
    this.bytes.copy(bytes);
    this.bytes = bytes;
  }
}

function isBlank(bytes: Buffer, from: number, to: number): boolean {
  for (let at = from; at < to; at += 1) if (bytes[at]! > 0x20) return false;
  return true;
}

/** Columns that a sheet can have: A to XFD. */
const MOST_SHEET_COLUMNS = 16_384;
