/* eslint-disable @typescript-eslint/no-non-null-assertion --
   Every index is below a length; checking each again would slow down every cell of a file. */
import type { ScannedRow } from '../delimited/row-scanner';
import type { IntakeIssue } from '../intake-issue';
import { LIMITS } from '../limits';
import { ByteDictionary } from './byte-dictionary';
import type { ChunkSink } from './chunk';
import { CodeChunks } from './code-chunks';
import { decodeText, type EncodingWatch } from './encoding-watch';

/** Rows of a chunk, unless there are so many columns that their chunks would fill the memory. */
const CHUNK_ROWS = 65_536;
const GATHERED_CODES = 16 * 1024 * 1024;

/** A column under way: its name as it stands in the file, its values, its codes. */
export interface ColumnEncoder {
  readonly name: Uint8Array;
  readonly dictionary: ByteDictionary;
  readonly codes: CodeChunks;
}

/** Rows that were left out, and why; lines are counted from 1. */
export interface SkippedRows {
  readonly blank: number;
  readonly repeatedHeaderLines: readonly number[];
}

/**
 * Encodes a table row by row: the first row that is not blank names the columns, every other one
 * adds a code to each.
 *
 * Blank rows and rows that repeat the names are left out and remembered. Fails on a row with more
 * or fewer cells than there are names, and on cells and columns beyond the limits.
 */
export class TableEncoder {
  columns: readonly ColumnEncoder[] = [];
  chunkRows = CHUNK_ROWS;
  rows = 0;
  private blank = 0;
  private readonly repeatedHeaderLines: number[] = [];

  constructor(
    private readonly encoding: EncodingWatch,
    private readonly sink: ChunkSink,
  ) {}

  get skipped(): SkippedRows {
    return { blank: this.blank, repeatedHeaderLines: this.repeatedHeaderLines };
  }

  /** Takes the next row; what it returns is a reason to stop. */
  add(row: ScannedRow): IntakeIssue | null {
    if (isBlankRow(row)) {
      this.blank += 1;
      return null;
    }
    if (this.columns.length === 0) return this.begin(row);
    if (row.count !== this.columns.length) return this.ragged(row);
    if (this.repeatsHeader(row)) {
      this.repeatedHeaderLines.push(row.line);
      return null;
    }
    return this.encode(row);
  }

  /** Gives the last codes away; at the end of the table. */
  flush(): void {
    for (const { codes } of this.columns) codes.flush();
  }

  /** Whether the distinct values still fit into memory. */
  checkSize(): IntakeIssue | null {
    const sizes = this.columns.map(({ dictionary }) => dictionary.byteLength);
    if (sizes.reduce((sum, size) => sum + size, 0) <= LIMITS.dictionaryBytes) return null;
    const largest = this.columns[sizes.indexOf(Math.max(...sizes))];
    return { code: 'tooMuchText', facts: { column: this.nameOf(largest) } };
  }

  private begin(row: ScannedRow): IntakeIssue | null {
    this.chunkRows = chunkRowsFor(row.count);
    this.columns = Array.from({ length: row.count }, (_, position) => ({
      name: Uint8Array.from(row.bytes.subarray(row.starts[position], row.ends[position])),
      dictionary: new ByteDictionary(),
      codes: new CodeChunks(position, this.chunkRows, this.sink),
    }));
    return this.checkNames(row.line);
  }

  private checkNames(line: number): IntakeIssue | null {
    for (const [position, column] of this.columns.entries()) {
      const issue = this.encoding.look(column.name, line);
      if (issue !== null) return issue;
      if (this.nameOf(column).length > LIMITS.nameCharacters) {
        return { code: 'nameTooLong', facts: { position: position + 1 } };
      }
    }
    return null;
  }

  private ragged({ line, count }: ScannedRow): IntakeIssue {
    const facts = { line, found: cellsInWords(count), expected: this.columns.length };
    return { code: 'raggedRow', facts };
  }

  private encode({ bytes, starts, ends, hashes, count, line }: ScannedRow): IntakeIssue | null {
    const { columns } = this;
    for (let cell = 0; cell < count; cell += 1) {
      const { dictionary, codes } = columns[cell]!;
      const known = dictionary.size;
      const start = starts[cell]!;
      const end = ends[cell]!;
      const code = dictionary.add(bytes, start, end, hashes[cell]!);
      if (code === known && !isShortAscii(bytes, start, end)) {
        const issue = this.lookAtNewValue(columns[cell]!, code, line);
        if (issue !== null) return issue;
      }
      codes.add(code);
    }
    this.rows += 1;
    return null;
  }

  private lookAtNewValue(column: ColumnEncoder, code: number, line: number): IntakeIssue | null {
    const value = column.dictionary.valueAt(code);
    if (value.length > LIMITS.cellBytes) {
      return { code: 'cellTooLong', facts: { line, column: this.nameOf(column) } };
    }
    return this.encoding.look(value, line);
  }

  private repeatsHeader({ bytes, starts, ends, count }: ScannedRow): boolean {
    if (count < 2) return false;
    for (let cell = 0; cell < count; cell += 1) {
      const { name } = this.columns[cell]!;
      const start = starts[cell]!;
      if (ends[cell]! - start !== name.length) return false;
      for (let at = 0; at < name.length; at += 1) {
        if (bytes[start + at] !== name[at]) return false;
      }
    }
    return true;
  }

  /** For messages while the encoding is not settled yet. */
  private nameOf(column: ColumnEncoder | undefined): string {
    return column === undefined ? '' : decodeText(column.name, 'utf-8');
  }
}

/** Values that are surely neither too long nor of any doubtful encoding; nearly all are. */
function isShortAscii(bytes: Uint8Array, from: number, to: number): boolean {
  let all = 0;
  for (let at = from; at < to; at += 1) all |= bytes[at]!;
  return all < 0x80 && to - from <= LIMITS.cellBytes;
}

function cellsInWords(cells: number): string {
  return cells === 1 ? '1 cell' : `${String(cells)} cells`;
}

function chunkRowsFor(columns: number): number {
  let rows = CHUNK_ROWS;
  while (rows * columns > GATHERED_CODES) rows /= 2;
  return rows;
}

/** Whether all cells are empty or hold blanks only; the first cell tells nearly always. */
function isBlankRow({ bytes, starts, ends, count }: ScannedRow): boolean {
  for (let cell = 0; cell < count; cell += 1) {
    for (let at = starts[cell]!; at < ends[cell]!; at += 1) {
      if (bytes[at] !== 0x20 && bytes[at] !== 0x09) return false;
    }
  }
  return true;
}
