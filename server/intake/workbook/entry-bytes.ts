import { pipeline, Readable } from 'node:stream';
import { crc32, createInflateRaw } from 'node:zlib';
import { LIMITS } from '../limits';
import { damaged, ReadingStopped } from './reading-stopped';
import type { ZipArchive, ZipEntry } from './zip-entries';

const PIECE_BYTES = 1 << 18;
const HEADER_BYTES = 30;
const HEADER_SIGNATURE = 0x04034b50;
const STORED = 0;
const DEFLATED = 8;

/**
 * How much a workbook has unpacked so far, over all its parts; more than is allowed stops the
 * reading before the memory is full.
 */
export class UnpackBudget {
  private unpacked = 0;
  private packedRead = 0;

  constructor(private readonly packedBytes: number) {}

  /** Share of the packed bytes that was read, 0..1. */
  get shareRead(): number {
    return Math.min(1, this.packedRead / this.packedBytes);
  }

  /** Counts packed bytes that were read. */
  read(bytes: number): void {
    this.packedRead += bytes;
  }

  /** Counts bytes that were unpacked. */
  spend(bytes: number): void {
    this.unpacked += bytes;
    this.expect(0);
  }

  /** Stops when more bytes, as announced, would be too many. */
  expect(bytes: number): void {
    const fair = Math.max(LIMITS.unpackedFreeBytes, this.packedBytes * LIMITS.unpackedRatio);
    if (this.unpacked + bytes <= Math.min(fair, LIMITS.unpackedBytes)) return;
    throw new ReadingStopped({ code: 'workbookTooLarge' });
  }
}

/** The unpacked bytes of a part, chunk by chunk, checked against its CRC at the end. */
export async function* entryBytes(
  archive: ZipArchive,
  entry: ZipEntry,
  budget: UnpackBudget,
): AsyncGenerator<Buffer> {
  budget.expect(entry.unpackedBytes);
  let checksum = 0;
  for await (const chunk of unpacked(archive, entry, budget)) {
    budget.spend(chunk.length);
    checksum = crc32(chunk, checksum);
    yield chunk;
  }
  if (checksum !== entry.crc32) throw damaged(`the part "${entry.name}"`);
}

async function* unpacked(
  archive: ZipArchive,
  entry: ZipEntry,
  budget: UnpackBudget,
): AsyncGenerator<Buffer> {
  const packed = packedBytes(archive, entry, budget);
  if (entry.method === STORED) {
    yield* packed;
    return;
  }
  if (entry.method !== DEFLATED) throw damaged(`the part "${entry.name}"`);
  const inflate = createInflateRaw();
  let failure: unknown = null;
  pipeline(Readable.from(packed), inflate, (problem) => {
    failure = problem;
  });
  try {
    for await (const chunk of inflate) yield chunk as Buffer;
  } catch (problem) {
    throw (failure ?? problem) instanceof ReadingStopped
      ? (failure ?? problem)
      : damaged(`the part "${entry.name}"`);
  }
}

async function* packedBytes(
  { handle }: ZipArchive,
  entry: ZipEntry,
  budget: UnpackBudget,
): AsyncGenerator<Buffer> {
  let position = await dataStart(handle, entry);
  const end = position + entry.compressedBytes;
  while (position < end) {
    const buffer = Buffer.alloc(Math.min(PIECE_BYTES, end - position));
    const { bytesRead } = await handle.read(buffer, 0, buffer.length, position);
    if (bytesRead === 0) throw damaged(`the part "${entry.name}"`);
    position += bytesRead;
    budget.read(bytesRead);
    yield buffer.subarray(0, bytesRead);
  }
}

async function dataStart(
  handle: ZipArchive['handle'],
  { name, headerOffset }: ZipEntry,
): Promise<number> {
  const header = Buffer.alloc(HEADER_BYTES);
  const { bytesRead } = await handle.read(header, 0, HEADER_BYTES, headerOffset);
  if (bytesRead < HEADER_BYTES || header.readUInt32LE(0) !== HEADER_SIGNATURE) {
    throw damaged(`the part "${name}"`);
  }
  return headerOffset + HEADER_BYTES + header.readUInt16LE(26) + header.readUInt16LE(28);
}
