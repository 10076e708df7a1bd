import { LIMITS } from '../limits';

const LENGTH_BYTES = 4;

/**
 * Packs the values of a dictionary into pieces of at most 256 KiB.
 *
 * A piece is the number of its values, the length in bytes of each, and their UTF-8 bytes one
 * after the other; numbers have 32 bits, little-endian. Takes values of at most `cellBytes` bytes.
 */
export function* packDictionary(values: Iterable<Uint8Array>): Generator<Uint8Array<ArrayBuffer>> {
  let gathered: Uint8Array[] = [];
  let size = LENGTH_BYTES;
  for (const value of values) {
    if (size + LENGTH_BYTES + value.length > LIMITS.chunkBytes) {
      yield packPiece(gathered, size);
      gathered = [];
      size = LENGTH_BYTES;
    }
    gathered.push(value);
    size += LENGTH_BYTES + value.length;
  }
  if (gathered.length > 0) yield packPiece(gathered, size);
}

function packPiece(values: readonly Uint8Array[], size: number): Uint8Array<ArrayBuffer> {
  const piece = new Uint8Array(size);
  const numbers = new DataView(piece.buffer);
  numbers.setUint32(0, values.length, true);
  let at = LENGTH_BYTES * (values.length + 1);
  values.forEach((value, index) => {
    numbers.setUint32(LENGTH_BYTES * (index + 1), value.length, true);
    piece.set(value, at);
    at += value.length;
  });
  return piece;
}

/** The values of a piece that `packDictionary` made. */
export function unpackDictionary(piece: Uint8Array): readonly string[] {
  const bytes = Buffer.from(piece.buffer, piece.byteOffset, piece.byteLength);
  const count = bytes.readUInt32LE(0);
  let at = LENGTH_BYTES * (count + 1);
  return Array.from({ length: count }, (_, index) => {
    const end = at + bytes.readUInt32LE(LENGTH_BYTES * (index + 1));
    const value = bytes.toString('utf8', at, end);
    at = end;
    return value;
  });
}
