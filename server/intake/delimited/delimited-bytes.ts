import { isUtf8 } from 'node:buffer';
import iconv from 'iconv-lite';
import { failure, success, type Result } from '#shared/core';
import type { TextEncoding } from '../encode/encoding-watch';
import type { IntakeIssue } from '../intake-issue';
import { sniffDelimiter } from './sniff-delimiter';

/** Stands for a delimiter that takes several bytes; no text file holds it. */
const STAND_IN = 0x1f;

const LAST_ASCII = 0x7f;

/** How the bytes of a delimited file become ones with a delimiter of one byte and no mark. */
export interface DelimitedForm {
  readonly delimiter: string;
  readonly delimiterByte: number;
  /** Set when the file itself settles how its characters are written. */
  readonly encoding: TextEncoding | null;
  readonly fromUtf16: boolean;
  /** Takes the chunks of the file in turn, then null for its end. */
  readonly convert: (chunk: Uint8Array | null) => Uint8Array;
}

/** What a person chose, or null to find it out. */
export interface DelimitedChoice {
  readonly delimiter: string | null;
  readonly encoding: TextEncoding | null;
}

/** Finds out how a delimited file is written, from its first bytes. */
export function delimitedForm(
  firstBytes: Uint8Array,
  choice: DelimitedChoice,
): Result<DelimitedForm, IntakeIssue> {
  const mark = byteOrderMarkOf(firstBytes);
  const delimiter = choice.delimiter ?? sniffDelimiter(beginningOf(firstBytes, mark));
  if (/["\r\n\0]/.test(delimiter)) {
    return failure({ code: 'badDelimiter', facts: { delimiter: JSON.stringify(delimiter) } });
  }
  if (mark === 'utf-16le' || mark === 'utf-16be') return success(utf16Form(delimiter, mark));
  const encoding = mark === 'utf-8' ? 'utf-8' : choice.encoding;
  return success(byteForm(delimiter, encoding, encoding ?? likelyEncoding(firstBytes), mark));
}

type ByteOrderMark = 'utf-8' | 'utf-16le' | 'utf-16be';

function byteOrderMarkOf([first, second, third]: Uint8Array): ByteOrderMark | null {
  if (first === 0xef && second === 0xbb && third === 0xbf) return 'utf-8';
  if (first === 0xff && second === 0xfe) return 'utf-16le';
  return first === 0xfe && second === 0xff ? 'utf-16be' : null;
}

/** As text in which the usual delimiters can be told; other characters don't matter. */
function beginningOf(firstBytes: Uint8Array, mark: ByteOrderMark | null): string {
  const buffer = Buffer.from(firstBytes);
  return mark === null || mark === 'utf-8' ? buffer.toString('latin1') : iconv.decode(buffer, mark);
}

/** The first bytes may end within a character, so a short end is not looked at. */
function likelyEncoding(firstBytes: Uint8Array): TextEncoding {
  const cuts = [0, 1, 2, 3].map((cut) => firstBytes.subarray(0, firstBytes.length - cut));
  return cuts.some((bytes) => isUtf8(bytes)) ? 'utf-8' : 'windows-1252';
}

const MARK_BYTES = 3;

function byteForm(
  delimiter: string,
  encoding: TextEncoding | null,
  likely: TextEncoding,
  mark: ByteOrderMark | null,
): DelimitedForm {
  const written = iconv.encode(delimiter, likely);
  const replace = written.length > 1 ? byteReplacer(written) : passOn;
  let skip = mark === null ? 0 : MARK_BYTES;
  const convert: DelimitedForm['convert'] = (chunk) => {
    const bytes = chunk?.subarray(skip) ?? null;
    skip = 0;
    return replace(bytes);
  };
  const delimiterByte = written.length > 1 ? STAND_IN : (written[0] ?? STAND_IN);
  const settled = delimiterByte > LAST_ASCII ? likely : encoding;
  return { delimiter, delimiterByte, encoding: settled, fromUtf16: false, convert };
}

function passOn(chunk: Uint8Array | null): Uint8Array {
  return chunk ?? new Uint8Array();
}

/** Replaces a sequence of bytes, also where it lies across two chunks. */
function byteReplacer(sequence: Buffer): DelimitedForm['convert'] {
  let held = Buffer.alloc(0);
  return (chunk) => {
    const bytes = chunk === null ? held : Buffer.concat([held, chunk]);
    const end = chunk === null ? bytes.length : bytes.length - partialLength(bytes, sequence);
    held = bytes.subarray(end);
    return replaceAll(bytes.subarray(0, end), sequence);
  };
}

/** How many bytes at the end may be the beginning of the sequence. */
function partialLength(bytes: Buffer, sequence: Buffer): number {
  for (let length = sequence.length - 1; length > 0; length -= 1) {
    if (bytes.subarray(-length).equals(sequence.subarray(0, length))) return length;
  }
  return 0;
}

function replaceAll(bytes: Buffer, sequence: Buffer): Uint8Array {
  const parts: Buffer[] = [];
  let from = 0;
  for (let at = bytes.indexOf(sequence); at >= 0; at = bytes.indexOf(sequence, from)) {
    parts.push(bytes.subarray(from, at), Buffer.of(STAND_IN));
    from = at + sequence.length;
  }
  parts.push(bytes.subarray(from));
  return Buffer.concat(parts);
}

function utf16Form(delimiter: string, mark: 'utf-16le' | 'utf-16be'): DelimitedForm {
  const decoder = iconv.getDecoder(mark);
  const replace =
    delimiter.charCodeAt(0) > LAST_ASCII ? byteReplacer(Buffer.from(delimiter)) : passOn;
  const convert: DelimitedForm['convert'] = (chunk) => {
    const text = chunk === null ? (decoder.end() ?? '') : decoder.write(Buffer.from(chunk));
    const bytes = replace(Buffer.from(text));
    return chunk === null ? Buffer.concat([bytes, replace(null)]) : bytes;
  };
  const ascii = delimiter.charCodeAt(0) <= LAST_ASCII;
  const delimiterByte = ascii ? delimiter.charCodeAt(0) : STAND_IN;
  return { delimiter, delimiterByte, encoding: 'utf-8', fromUtf16: true, convert };
}
