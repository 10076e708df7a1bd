import { inflateSync } from 'node:zlib';

/**
 * Unpacks a WOFF 1 font to the TrueType or OpenType font inside it.
 *
 * Source: W3C Recommendation "WOFF File Format 1.0", sections 3 to 5.
 */
export function woffToTtf(woff: Buffer): Buffer {
  const tables = tablesOf(woff);
  const directory = Buffer.alloc(HEADER + ENTRY * tables.length);
  writeHeader(directory, woff.readUInt32BE(4), tables.length);
  const parts: Buffer[] = [directory];
  let offset = directory.length;
  for (const [index, table] of tables.entries()) {
    writeEntry(directory, HEADER + ENTRY * index, table, offset);
    const padding = Buffer.alloc((4 - (table.data.length % 4)) % 4);
    parts.push(table.data, padding);
    offset += table.data.length + padding.length;
  }
  return Buffer.concat(parts);
}

interface FontTable {
  readonly tag: string;
  readonly checksum: number;
  readonly data: Buffer;
}

const WOFF_HEADER = 44;
const WOFF_ENTRY = 20;
const HEADER = 12;
const ENTRY = 16;

function tablesOf(woff: Buffer): readonly FontTable[] {
  return Array.from({ length: woff.readUInt16BE(12) }, (_, index) => {
    const at = WOFF_HEADER + WOFF_ENTRY * index;
    const [offset, packed, length, checksum] = [4, 8, 12, 16].map((field) =>
      woff.readUInt32BE(at + field),
    ) as [number, number, number, number];
    const stored = woff.subarray(offset, offset + packed);
    const data = packed < length ? inflateSync(stored) : stored;
    return { tag: woff.toString('latin1', at, at + 4), checksum, data };
  });
}

function writeHeader(directory: Buffer, flavour: number, count: number): void {
  const power = Math.floor(Math.log2(count));
  const range = 2 ** power * ENTRY;
  directory.writeUInt32BE(flavour, 0);
  for (const [index, field] of [count, range, power, count * ENTRY - range].entries()) {
    directory.writeUInt16BE(field, 4 + 2 * index);
  }
}

function writeEntry(directory: Buffer, at: number, table: FontTable, offset: number): void {
  directory.write(table.tag, at, 'latin1');
  for (const [index, field] of [table.checksum, offset, table.data.length].entries()) {
    directory.writeUInt32BE(field, at + 4 * (index + 1));
  }
}
