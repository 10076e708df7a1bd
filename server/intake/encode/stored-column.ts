import type { Codes } from '#shared/tally';

/** Where the rows of a column lie: how many there are, how many a chunk holds, the widest code. */
export interface CodeLayout {
  readonly rows: number;
  readonly chunkRows: number;
  readonly width: number;
}

/** The codes of a column, put together from its chunks in order. */
export function unpackCodes(
  chunks: readonly Uint8Array[],
  { rows, chunkRows, width }: CodeLayout,
): Codes {
  const codes = emptyCodes(rows, width);
  chunks.forEach((bytes, chunk) => {
    const from = chunk * chunkRows;
    const length = Math.min(chunkRows, rows - from);
    codes.set(codesOf(bytes, bytes.length / length), from);
  });
  return codes;
}

function emptyCodes(rows: number, width: number): Codes {
  if (width === 1) return new Uint8Array(rows);
  return width === 2 ? new Uint16Array(rows) : new Uint32Array(rows);
}

/** Stored codes are little-endian, and so are the machines that this runs on. */
function codesOf(bytes: Uint8Array, width: number): Codes {
  if (width === 1) return bytes;
  const aligned = Uint8Array.from(bytes);
  return width === 2 ? new Uint16Array(aligned.buffer) : new Uint32Array(aligned.buffer);
}
