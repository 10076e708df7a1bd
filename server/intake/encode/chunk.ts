/** What a chunk is a piece of: the codes of the rows, or the values they stand for. */
export type ChunkPart = 'codes' | 'dictionary';

/** A piece of a column, at most 256 KiB, in its place. */
export interface Chunk {
  readonly position: number;
  readonly part: ChunkPart;
  readonly chunk: number;
  readonly bytes: Uint8Array<ArrayBuffer>;
}

/** Takes chunks as they come; whoever makes them gives their bytes away. */
export type ChunkSink = (chunk: Chunk) => void;
