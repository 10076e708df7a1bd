import { LIMITS } from '../limits';

const LENGTH_BYTES = 4;

/** Values in order, as bytes one after the other; a `ByteDictionary` is one. */
export interface PackableValues {
  readonly size: number;
  readonly lengthAt: (index: number) => number;
  readonly valuesFrom: (from: number, to: number) => Uint8Array;
}

/**
 * Packs the values of a dictionary into pieces of at most 256 KiB.
 *
 * A piece is the number of its values, the length in bytes of each, and their UTF-8 bytes one
 * after the other; numbers have 32 bits, little-endian. Takes values of at most `cellBytes` bytes.
 */
export function* packDictionary(values: PackableValues): Generator<Uint8Array<ArrayBuffer>> {
  let from = 0;
  let size = LENGTH_BYTES;
  for (let index = 0; index < values.size; index += 1) {
    const more = LENGTH_BYTES + values.lengthAt(index);
    if (size + more > LIMITS.chunkBytes) {
      yield packPiece(values, from, index, size);
      from = index;
      size = LENGTH_BYTES;
    }
    size += more;
  }
  if (from < values.size) yield packPiece(values, from, values.size, size);
}

function packPiece(
  values: PackableValues,
  from: number,
  to: number,
  size: number,
): Uint8Array<ArrayBuffer> {
  const piece = new Uint8Array(size);
  const numbers = new DataView(piece.buffer);
  numbers.setUint32(0, to - from, true);
  for (let index = from; index < to; index += 1) {
    numbers.setUint32(LENGTH_BYTES * (index - from + 1), values.lengthAt(index), true);
  }
  piece.set(values.valuesFrom(from, to), LENGTH_BYTES * (to - from + 1));
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
