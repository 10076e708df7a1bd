import { inflateRawSync } from 'node:zlib';

const END_OF_DIRECTORY = 0x06054b50;
const ENTRY = 0x02014b50;

/**
 * The parts of a zip file by path. Reads it with nothing but Node's own inflate, so that no library
 * that wrote a file also reads it.
 *
 * Source: APPNOTE.TXT, .ZIP File Format Specification, 4.3.
 */
export function unzip(bytes: Uint8Array): ReadonlyMap<string, Uint8Array> {
  const file = Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  const parts = new Map<string, Uint8Array>();
  const end = endOfDirectory(file);
  let at = file.readUInt32LE(end + 16);
  for (let entry = file.readUInt16LE(end + 10); entry > 0; entry -= 1) {
    if (file.readUInt32LE(at) !== ENTRY) throw new Error('The directory of the zip is damaged.');
    const [nameLength, extraLength, commentLength] = [28, 30, 32].map((place) =>
      file.readUInt16LE(at + place),
    ) as [number, number, number];
    const path = file.toString('utf8', at + 46, at + 46 + nameLength);
    parts.set(path, contentOf(file, at));
    at += 46 + nameLength + extraLength + commentLength;
  }
  return parts;
}

function endOfDirectory(file: Buffer): number {
  for (let at = file.length - 22; at >= 0; at -= 1) {
    if (file.readUInt32LE(at) === END_OF_DIRECTORY) return at;
  }
  throw new Error('This is no zip file.');
}

function contentOf(file: Buffer, entry: number): Uint8Array {
  const method = file.readUInt16LE(entry + 10);
  const packedLength = file.readUInt32LE(entry + 20);
  const local = file.readUInt32LE(entry + 42);
  const start = local + 30 + file.readUInt16LE(local + 26) + file.readUInt16LE(local + 28);
  const packed = file.subarray(start, start + packedLength);
  if (method === 0) return packed;
  if (method === 8) return inflateRawSync(packed);
  throw new Error(`Method ${method} of a zip is not known here.`);
}
