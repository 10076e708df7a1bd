import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { LIMITS } from '../limits';
import { ByteDictionary, hashBytes } from './byte-dictionary';
import type { Chunk } from './chunk';
import { CodeChunks } from './code-chunks';
import { packDictionary, unpackDictionary, type PackableValues } from './dictionary-chunks';
import { unpackCodes } from './stored-column';

describe('ByteDictionary', () => {
  it('numbers values in order of first appearance and counts their rows', () => {
    fc.assert(
      fc.property(fc.array(fc.string({ maxLength: 4 }), { maxLength: 2000 }), (cells) => {
        const dictionary = new ByteDictionary();
        const codes = cells.map((cell) => add(dictionary, cell));
        const distinct = [...new Set(cells)];
        expect(codes).toEqual(cells.map((cell) => distinct.indexOf(cell)));
        expect(valuesOf(dictionary)).toEqual(distinct);
        distinct.forEach((value, code) => {
          expect(dictionary.counts[code]).toBe(cells.filter((cell) => cell === value).length);
        });
      }),
    );
  });

  it('holds very many and very long values, and tells values of one hash apart', () => {
    const dictionary = new ByteDictionary();
    const many = Array.from({ length: 50_000 }, (_, at) => String(at));
    many.forEach((value) => add(dictionary, value));
    add(dictionary, 'x'.repeat(100_000));
    const bytes = Buffer.from('other');
    expect(dictionary.add(bytes, 0, 5, hashBytes(Buffer.from('7'), 0, 1))).toBe(50_001);
    expect(dictionary.size).toBe(50_002);
    expect(valuesOf(dictionary).slice(0, 50_000)).toEqual(many);
  });
});

describe('CodeChunks', () => {
  it.each([1, 5, 4096, 4097, 20_000])('gives back %d codes of any width', (rows) => {
    for (const largest of [200, 60_000, 4_000_000]) {
      const codes = Array.from({ length: rows }, (_, row) => (row * 7919) % (largest + 1));
      const chunks: Chunk[] = [];
      const gathered = new CodeChunks(3, 4096, (chunk) => chunks.push(chunk));
      for (let from = 0; from < rows; from += 999) {
        const some = Uint32Array.from(codes.slice(from, from + 999));
        gathered.add(some, some.length);
      }
      gathered.flush();
      expect(chunks.map(({ position, part, chunk }) => [position, part, chunk])).toEqual(
        chunks.map((_, chunk) => [3, 'codes', chunk]),
      );
      const layout = { rows, chunkRows: 4096, width: gathered.width };
      expect([
        ...unpackCodes(
          chunks.map(({ bytes }) => bytes),
          layout,
        ),
      ]).toEqual(codes);
    }
  });

  it('keeps a chunk narrow whose codes are small', () => {
    const chunks: Chunk[] = [];
    const gathered = new CodeChunks(0, 2, (chunk) => chunks.push(chunk));
    gathered.add(Uint32Array.of(300, 1, 2, 3), 4);
    expect(chunks.map(({ bytes }) => bytes.length)).toEqual([4, 2]);
  });
});

describe('packDictionary', () => {
  it('gives back every value, in pieces that can be stored', () => {
    fc.assert(
      fc.property(
        fc.array(
          fc.oneof(
            fc.string({ unit: 'grapheme' }),
            fc.integer({ min: 0, max: LIMITS.cellBytes }).map((length) => 'y'.repeat(length)),
          ),
          { maxLength: 30 },
        ),
        (values) => {
          const pieces = [...packDictionary(packable(values))];
          expect(pieces.every(({ length }) => length <= LIMITS.chunkBytes)).toBe(true);
          expect(pieces.flatMap(unpackDictionary)).toEqual(values);
        },
      ),
    );
  });
});

function packable(values: readonly string[]): PackableValues {
  const bytes = values.map((value) => Buffer.from(value));
  return {
    size: bytes.length,
    lengthAt: (index) => bytes[index]!.length,
    valuesFrom: (from, to) => Buffer.concat(bytes.slice(from, to)),
  };
}

function add(dictionary: ByteDictionary, value: string): number {
  const bytes = Buffer.from(value);
  return dictionary.add(bytes, 0, bytes.length, hashBytes(bytes, 0, bytes.length));
}

function valuesOf(dictionary: ByteDictionary): readonly string[] {
  return Array.from({ length: dictionary.size }, (_, code) =>
    Buffer.from(dictionary.valueAt(code)).toString('utf8'),
  );
}
