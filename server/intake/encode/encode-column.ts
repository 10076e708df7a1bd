import { ByteDictionary, hashBytes } from './byte-dictionary';
import type { Chunk } from './chunk';
import { CodeChunks } from './code-chunks';
import { packDictionary } from './dictionary-chunks';

/** Rows of a chunk of a column that was encoded at once. */
export const ROWS_OF_A_TYPED_CHUNK = 65_536;

/** A column encoded at once, as it is stored. */
export interface EncodedAtOnce {
  readonly chunks: readonly Chunk[];
  readonly width: number;
  readonly dictionarySize: number;
}

/** Encodes the cells of a short column that is in memory already. */
export function encodeColumn(position: number, cells: readonly string[]): EncodedAtOnce {
  const chunks: Chunk[] = [];
  const codes = new CodeChunks(position, ROWS_OF_A_TYPED_CHUNK, (chunk) => chunks.push(chunk));
  const dictionary = new ByteDictionary();
  const cellCodes = Uint32Array.from(cells, (cell) => {
    const bytes = Buffer.from(cell);
    return dictionary.add(bytes, 0, bytes.length, hashBytes(bytes, 0, bytes.length));
  });
  codes.add(cellCodes, cellCodes.length);
  codes.flush();
  const pieces = [...packDictionary(dictionary)].map((bytes, chunk): Chunk => ({
    position,
    part: 'dictionary',
    chunk,
    bytes,
  }));
  return { chunks: [...chunks, ...pieces], width: codes.width, dictionarySize: dictionary.size };
}
