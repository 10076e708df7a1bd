import { createHash } from 'node:crypto';
import { open, type FileHandle } from 'node:fs/promises';

const CHUNK_BYTES = 1 << 20;
const FIRST_BYTES = 1 << 16;

/** A file being read from start to end; its hash is taken on the way. */
export interface SourceFile {
  readonly size: number;
  /** The first 64 KiB, or less. */
  readonly firstBytes: Uint8Array;
  /** Where the file is, for readers that do not read from start to end. */
  readonly handle: FileHandle;
  /** The bytes from start to end, once; a chunk is valid until the next one. */
  readonly chunks: () => AsyncGenerator<Uint8Array>;
  /** Reads all bytes for their hash only, stopping at `pause` now and then. */
  readonly readThrough: (pause: () => Promise<void>) => Promise<void>;
  /** Share of the bytes that were read, 0..1. */
  readonly shareRead: () => number;
  /** The SHA-256 of the bytes read by `chunks`, in hexadecimal; to be asked for once. */
  readonly sha256: () => string;
  readonly close: () => Promise<void>;
}

/** Opens a file for reading. */
export async function openSourceFile(path: string): Promise<SourceFile> {
  const handle = await open(path, 'r');
  const { size } = await handle.stat();
  const firstBytes = new Uint8Array(Math.min(FIRST_BYTES, size));
  await handle.read(firstBytes, 0, firstBytes.length, 0);
  const hash = createHash('sha256');
  let done = 0;
  const chunks = async function* (): AsyncGenerator<Uint8Array> {
    for await (const chunk of bytesOf(handle)) {
      hash.update(chunk);
      done += chunk.length;
      yield chunk;
    }
  };
  return {
    size,
    firstBytes,
    handle,
    chunks,
    readThrough: async (pause) => {
      const reading = chunks();
      while ((await reading.next()).done !== true) await pause();
    },
    shareRead: () => (size === 0 ? 1 : Math.min(1, done / size)),
    sha256: () => hash.digest('hex'),
    close: () => handle.close(),
  };
}

async function* bytesOf(handle: FileHandle): AsyncGenerator<Uint8Array> {
  const buffer = new Uint8Array(CHUNK_BYTES);
  let position = 0;
  for (;;) {
    const { bytesRead } = await handle.read(buffer, 0, buffer.length, position);
    if (bytesRead === 0) return;
    position += bytesRead;
    yield buffer.subarray(0, bytesRead);
  }
}
