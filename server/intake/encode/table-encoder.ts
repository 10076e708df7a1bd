/* eslint-disable @typescript-eslint/no-non-null-assertion --
   Every index is below a length; checking each again would slow down every cell of a file. */
import type { RowSink, ScannedRow } from '../delimited/row-scanner';
import type { IntakeIssue } from '../intake-issue';
import { LIMITS } from '../limits';
import { BATCH_ROWS, ByteDictionary } from './byte-dictionary';
import type { ChunkSink } from './chunk';
import { CodeChunks } from './code-chunks';
import { decodeText, type EncodingWatch } from './encoding-watch';
import { RowBatch } from './row-batch';

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
export class TableEncoder implements RowSink {
  columns: readonly ColumnEncoder[] = [];
  chunkRows = CHUNK_ROWS;
  rows = 0;
  private blank = 0;
  private readonly repeatedHeaderLines: number[] = [];
  private batch = new RowBatch(0);
  private readonly codes = new Uint32Array(BATCH_ROWS);

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
    this.batch.add(row);
    this.rows += 1;
    return this.batch.full ? this.settle() : null;
  }

  /** Encodes the rows that were taken since the last time. */
  settle(): IntakeIssue | null {
    const { batch, codes } = this;
    const doubtful: DoubtfulValue[] = [];
    this.columns.forEach((column, position) => {
      const known = column.dictionary.size;
      column.dictionary.addAll(batch, position, codes);
      column.codes.add(codes, batch.rows);
      for (let code = known; code < column.dictionary.size; code += 1) {
        if (isShortAscii(column.dictionary, code)) continue;
        doubtful.push({ column, code, line: batch.lines[codes.indexOf(code)]! });
      }
    });
    batch.rows = 0;
    return this.lookAt(doubtful);
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
    this.batch = new RowBatch(row.count);
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

  /** Looks at new values in the order of the file, so that the first fault is told. */
  private lookAt(values: readonly DoubtfulValue[]): IntakeIssue | null {
    const inOrder = values.toSorted((one, other) => one.line - other.line);
    for (const { column, code, line } of inOrder) {
      const value = column.dictionary.valueAt(code);
      if (value.length > LIMITS.cellBytes) {
        return { code: 'cellTooLong', facts: { line, column: this.nameOf(column) } };
      }
      const issue = this.encoding.look(value, line);
      if (issue !== null) return issue;
    }
    return null;
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

/** A value that appears for the first time and may be too long or of a doubtful encoding. */
interface DoubtfulValue {
  readonly column: ColumnEncoder;
  readonly code: number;
  readonly line: number;
}

/** Values that are surely neither; nearly all are. */
function isShortAscii(dictionary: ByteDictionary, code: number): boolean {
  const bytes = dictionary.allBytes;
  const to = dictionary.startOf(code + 1);
  let all = 0;
  for (let at = dictionary.startOf(code); at < to; at += 1) all |= bytes[at]!;
  return all < 0x80 && dictionary.lengthAt(code) <= LIMITS.cellBytes;
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
