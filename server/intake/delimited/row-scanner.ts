/* eslint-disable @typescript-eslint/no-non-null-assertion --
   Every index is below a length; checking each again would slow down every byte of a file. */
import { hashBytes, HASH_FACTOR, HASH_SEED } from '../encode/byte-dictionary';
import type { IntakeIssue } from '../intake-issue';
import { LIMITS } from '../limits';

const QUOTE = 0x22;
const LINE_FEED = 0x0a;
const CARRIAGE_RETURN = 0x0d;

/** The cells of one row: where in `bytes` each begins and ends, and the hash of what it holds. */
export interface ScannedRow {
  readonly bytes: Uint8Array;
  readonly starts: Int32Array;
  readonly ends: Int32Array;
  readonly hashes: Int32Array;
  readonly count: number;
  /** Where the row began, counted from 1 in lines of the file. */
  readonly line: number;
}

/** Takes rows as they are found; an issue ends the reading. */
export interface RowSink {
  /** Takes a row. Its places hold during the call, its bytes until `settle`. */
  readonly add: (row: ScannedRow) => IntakeIssue | null;
  /** Makes an end of what was taken, since the bytes will be others. */
  readonly settle: () => IntakeIssue | null;
}

/**
 * Splits delimited bytes into rows of cells (RFC 4180, with any one-byte delimiter and any kind of
 * line end).
 *
 * A quoted cell may hold delimiters, line ends and doubled quotes; a quote inside an unquoted cell
 * is an ordinary character. Works on bytes, so that it is the same for UTF-8 and Windows-1252.
 * Fails on text after a closing quote, a quote that is never closed, a NUL byte, too many cells.
 */
export class RowScanner {
  private bytes = new Uint8Array(1 << 16);
  private length = 0;
  private line = 1;
  private readonly starts = new Int32Array(LIMITS.columns + 1);
  private readonly ends = new Int32Array(LIMITS.columns + 1);
  private readonly hashes = new Int32Array(LIMITS.columns + 1);
  /** 1 where a quoted cell holds doubled quotes, which are made single when the row is whole. */
  private readonly doubled = new Uint8Array(LIMITS.columns + 1);
  private readonly stops = new Uint8Array(256);
  private count = 0;
  private linesWithin = 0;
  private quoteOpenedAt = 1;
  private issue: IntakeIssue | null = null;

  constructor(
    delimiter: number,
    private readonly sink: RowSink,
  ) {
    for (const stop of [0, delimiter, LINE_FEED, CARRIAGE_RETURN]) this.stops[stop] = 1;
  }

  /** Takes the next bytes of the file. */
  push(chunk: Uint8Array): IntakeIssue | null {
    this.makeRoom(chunk.length);
    this.bytes.set(chunk, this.length);
    this.length += chunk.length;
    return this.scanRows(false);
  }

  /** Takes the end of the file: what is left is the last row. */
  end(): IntakeIssue | null {
    return this.scanRows(true);
  }

  private makeRoom(more: number): void {
    if (this.length + more <= this.bytes.length) return;
    const larger = new Uint8Array(Math.max(this.length + more, this.bytes.length * 2));
    larger.set(this.bytes.subarray(0, this.length));
    this.bytes = larger;
  }

  private scanRows(last: boolean): IntakeIssue | null {
    let from = 0;
    let issue: IntakeIssue | null = null;
    while (from < this.length && issue === null) {
      const next = this.scanRow(from, last);
      issue = this.issue;
      if (next < 0) break;
      issue = this.giveRow();
      from = next;
    }
    // What the rows before hold comes first, as it does in the file.
    return this.sink.settle() ?? issue ?? this.keepRest(from);
  }

  private keepRest(from: number): IntakeIssue | null {
    this.bytes.copyWithin(0, from, this.length);
    this.length -= from;
    if (this.length <= LIMITS.rowBytes) return null;
    return { code: 'rowTooLong', facts: { line: Math.max(this.line, this.quoteOpenedAt) } };
  }

  /** Scans one row; gives where the next one begins, or −1 when the rest of it is still to come. */
  private scanRow(from: number, last: boolean): number {
    this.count = 0;
    this.linesWithin = 0;
    let at = from;
    for (;;) {
      at = this.bytes[at] === QUOTE && at < this.length ? this.quoted(at) : this.plain(at);
      if (at < 0) return last ? this.fail('quoteNotClosed', this.quoteOpenedAt) : -1;
      if (this.count > LIMITS.columns) return this.fail('tooManyColumns');
      if (at >= this.length) return last ? at : -1;
      const stop = this.bytes[at];
      at += 1;
      if (stop === 0) return this.fail('binaryContent');
      if (stop === LINE_FEED) return at;
      if (stop === CARRIAGE_RETURN) return this.afterCarriageReturn(at, last);
    }
  }

  private afterCarriageReturn(at: number, last: boolean): number {
    if (at >= this.length) return last ? at : -1;
    return this.bytes[at] === LINE_FEED ? at + 1 : at;
  }

  /** Scans an unquoted cell; gives where it stops. */
  private plain(from: number): number {
    const { bytes, length, stops } = this;
    let hash = HASH_SEED;
    let at = from;
    while (at < length) {
      const byte = bytes[at]!;
      if (stops[byte] === 1) break;
      hash = Math.imul(hash ^ byte, HASH_FACTOR);
      at += 1;
    }
    this.addCell(from, at, hash, 0);
    return at;
  }

  /** Scans a quoted cell; gives where it stops, after the closing quote, or −1. */
  private quoted(from: number): number {
    const { bytes, length } = this;
    this.quoteOpenedAt = this.line + this.linesWithin;
    let doubled = 0;
    let at = from + 1;
    for (;;) {
      at = this.closingQuote(at);
      if (at < 0) return -1;
      if (at + 1 >= length || bytes[at + 1] !== QUOTE) break;
      doubled = 1;
      at += 2;
    }
    if (at + 1 < length && this.stops[bytes[at + 1]!] !== 1) return this.fail('strayQuote');
    this.addCell(from + 1, at, doubled === 1 ? 0 : hashBytes(bytes, from + 1, at), doubled);
    return at + 1;
  }

  private closingQuote(from: number): number {
    const { bytes, length } = this;
    for (let at = from; at < length; at += 1) {
      const byte = bytes[at]!;
      if (byte === QUOTE) return at;
      if (byte === 0) return this.fail('binaryContent');
      if (byte === LINE_FEED) this.linesWithin += 1;
      else if (byte === CARRIAGE_RETURN && bytes[at + 1] !== LINE_FEED) this.linesWithin += 1;
    }
    return -1;
  }

  private addCell(start: number, end: number, hash: number, doubled: number): void {
    const { count } = this;
    this.starts[count] = start;
    this.ends[count] = end;
    this.hashes[count] = hash;
    this.doubled[count] = doubled;
    this.count = count + 1;
  }

  private fail(code: IntakeIssue['code'], line = this.line + this.linesWithin): number {
    this.issue ??= { code, facts: { line } };
    return -1;
  }

  private giveRow(): IntakeIssue | null {
    const { bytes, starts, ends, hashes, count, line } = this;
    for (let cell = 0; cell < count; cell += 1) {
      if (this.doubled[cell] === 1) this.makeSingle(cell);
    }
    this.line += 1 + this.linesWithin;
    return this.sink.add({ bytes, starts, ends, hashes, count, line });
  }

  /** Turns doubled quotes into single ones in place; the row is not scanned again. */
  private makeSingle(cell: number): void {
    const { bytes } = this;
    const end = this.ends[cell]!;
    let to = this.starts[cell]!;
    for (let at = to; at < end; at += 1) {
      bytes[to] = bytes[at]!;
      if (bytes[at] === QUOTE) at += 1;
      to += 1;
    }
    this.ends[cell] = to;
    this.hashes[cell] = hashBytes(bytes, this.starts[cell]!, to);
  }
}
