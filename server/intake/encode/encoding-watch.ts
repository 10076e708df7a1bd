import { isUtf8 } from 'node:buffer';
import iconv from 'iconv-lite';
import { failure, success, type Result } from '#shared/core';
import type { IntakeIssue } from '../intake-issue';
import type { ByteDictionary } from './byte-dictionary';
import type { PackableValues } from './dictionary-chunks';

/** How the characters of a file are written. */
export type TextEncoding = 'utf-8' | 'windows-1252';

/** Bytes that Windows-1252 leaves without a character. */
const UNDEFINED_IN_1252 = new Set([0x81, 0x8d, 0x8f, 0x90, 0x9d]);

/**
 * Finds out how the characters of a file are written, from its distinct values only.
 *
 * With an encoding given it only checks that it fits. Without one, values that are valid UTF-8
 * settle it as UTF-8, values that are not as Windows-1252, and a mixture is refused.
 */
export class EncodingWatch {
  private validLine: number | null = null;
  private invalidLine: number | null = null;
  private undefinedLine: number | null = null;

  constructor(private readonly given: TextEncoding | null) {}

  /** Looks at a value that appears for the first time, in some line. */
  look(value: Uint8Array, line: number): IntakeIssue | null {
    if (isAscii(value)) return null;
    if (isUtf8(value)) this.validLine ??= line;
    else this.invalidLine ??= line;
    if (value.some((byte) => UNDEFINED_IN_1252.has(byte))) this.undefinedLine ??= line;
    if (this.given !== 'utf-8' || this.invalidLine === null) return null;
    return { code: 'notUtf8', facts: { line: this.invalidLine } };
  }

  /** The encoding of the file, once all of it was looked at. */
  settle(): Result<TextEncoding, IntakeIssue> {
    const encoding = this.given ?? (this.invalidLine === null ? 'utf-8' : 'windows-1252');
    if (encoding === 'utf-8') return success(encoding);
    if (this.given === null && this.validLine !== null) {
      return failure({ code: 'mixedEncodings', facts: { line: this.invalidLine ?? 1 } });
    }
    return this.undefinedLine === null
      ? success(encoding)
      : failure({ code: 'unknownEncoding', facts: { line: this.undefinedLine } });
  }
}

/** The text of some bytes; bytes that do not fit become replacement characters. */
export function decodeText(bytes: Uint8Array, encoding: TextEncoding): string {
  const buffer = Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  return encoding === 'utf-8' ? buffer.toString('utf8') : iconv.decode(buffer, 'windows-1252');
}

/** A dictionary of the same values whose bytes are UTF-8. */
export function asUtf8(dictionary: ByteDictionary, encoding: TextEncoding): PackableValues {
  if (encoding === 'utf-8' || isAscii(dictionary.valuesFrom(0, dictionary.size))) return dictionary;
  const values = Array.from({ length: dictionary.size }, (_, code) =>
    Buffer.from(decodeText(dictionary.valueAt(code), encoding)),
  );
  return {
    size: values.length,
    lengthAt: (index) => values[index]?.length ?? 0,
    valuesFrom: (from, to) => Buffer.concat(values.slice(from, to)),
  };
}

function isAscii(bytes: Uint8Array): boolean {
  for (const byte of bytes) if (byte > 0x7f) return false;
  return true;
}
