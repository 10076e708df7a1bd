import type { FileHandle } from 'node:fs/promises';
import { damaged } from './reading-stopped';

/** A file within a ZIP archive, as the archive's directory lists it. */
export interface ZipEntry {
  readonly name: string;
  readonly method: number;
  readonly compressedBytes: number;
  /** As the directory says; the truth shows only when it is unpacked. */
  readonly unpackedBytes: number;
  readonly crc32: number;
  readonly headerOffset: number;
}

/** The archive: where it lies and what it holds, by name in small letters. */
export interface ZipArchive {
  readonly handle: FileHandle;
  readonly entries: ReadonlyMap<string, ZipEntry>;
}

const END_SIGNATURE = 0x06054b50;
const END_BYTES = 22;
const LONGEST_COMMENT = 65_535;
const DIRECTORY_LIMIT = 16 * 1024 * 1024;

/**
 * Reads the directory of a ZIP archive; stops with `damagedWorkbook` where it is not sound.
 *
 * Source: PKWARE, .ZIP File Format Specification (APPNOTE.TXT), sections 4.3 and 4.5.
 */
export async function readZipDirectory(handle: FileHandle, size: number): Promise<ZipArchive> {
  const tail = await readBytes(handle, Math.max(0, size - END_BYTES - LONGEST_COMMENT), size);
  const end = lastEndRecord(tail);
  const directoryBytes = tail.readUInt32LE(end + 12);
  const offset = tail.readUInt32LE(end + 16);
  if (directoryBytes > DIRECTORY_LIMIT || offset + directoryBytes > size)
    throw damaged('directory');
  const directory = await readBytes(handle, offset, offset + directoryBytes);
  const entries = entriesOf(directory, tail.readUInt16LE(end + 10));
  return { handle, entries: new Map(entries.map((entry) => [entry.name.toLowerCase(), entry])) };
}

async function readBytes(handle: FileHandle, from: number, to: number): Promise<Buffer> {
  const buffer = Buffer.alloc(Math.max(0, to - from));
  const { bytesRead } = await handle.read(buffer, 0, buffer.length, from);
  if (bytesRead < buffer.length) throw damaged('directory');
  return buffer;
}

function lastEndRecord(tail: Buffer): number {
  for (let at = tail.length - END_BYTES; at >= 0; at -= 1) {
    if (tail.readUInt32LE(at) === END_SIGNATURE) return at;
  }
  throw damaged('directory');
}

const ENTRY_SIGNATURE = 0x02014b50;
const ENTRY_BYTES = 46;

function entriesOf(directory: Buffer, count: number): readonly ZipEntry[] {
  const entries: ZipEntry[] = [];
  let at = 0;
  for (let index = 0; index < count; index += 1) {
    if (at + ENTRY_BYTES > directory.length) throw damaged('directory');
    if (directory.readUInt32LE(at) !== ENTRY_SIGNATURE) throw damaged('directory');
    entries.push(entryAt(directory, at));
    at += ENTRY_BYTES + tailLengths(directory, at).reduce((sum, length) => sum + length, 0);
  }
  return entries;
}

/** Lengths of name, extra field and comment. */
function tailLengths(directory: Buffer, at: number): readonly [number, number, number] {
  return [
    directory.readUInt16LE(at + 28),
    directory.readUInt16LE(at + 30),
    directory.readUInt16LE(at + 32),
  ];
}

const ENCRYPTED = 1;

function entryAt(directory: Buffer, at: number): ZipEntry {
  const [nameLength, extraLength] = tailLengths(directory, at);
  const nameEnd = at + ENTRY_BYTES + nameLength;
  if (nameEnd + extraLength > directory.length) throw damaged('directory');
  if ((directory.readUInt16LE(at + 8) & ENCRYPTED) !== 0) throw damaged('an encrypted part');
  const wide = wideNumbers(directory.subarray(nameEnd, nameEnd + extraLength));
  const unpackedBytes = wide(directory.readUInt32LE(at + 24));
  const compressedBytes = wide(directory.readUInt32LE(at + 20));
  return {
    name: directory.toString('utf8', at + ENTRY_BYTES, nameEnd).replaceAll('\\', '/'),
    method: directory.readUInt16LE(at + 10),
    compressedBytes,
    unpackedBytes,
    crc32: directory.readUInt32LE(at + 16),
    headerOffset: wide(directory.readUInt32LE(at + 42)),
  };
}

const ZIP64_FIELD = 1;
const SEE_ZIP64 = 0xffffffff;

/** Gives numbers that did not fit into 32 bits from the ZIP64 field, in their fixed order. */
function wideNumbers(extra: Buffer): (narrow: number) => number {
  let at = zip64Field(extra);
  return (narrow) => {
    if (narrow !== SEE_ZIP64) return narrow;
    if (at < 0 || at + 8 > extra.length) throw damaged('directory');
    at += 8;
    return Number(extra.readBigUInt64LE(at - 8));
  };
}

function zip64Field(extra: Buffer): number {
  for (let at = 0; at + 4 <= extra.length; at += 4 + extra.readUInt16LE(at + 2)) {
    if (extra.readUInt16LE(at) === ZIP64_FIELD) return at + 4;
  }
  return -1;
}
