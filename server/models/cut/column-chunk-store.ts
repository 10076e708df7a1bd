import { QueryTypes, type InferAttributes, type ModelStatic, type Sequelize } from 'sequelize';
import { within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineColumnChunks, type ChunkPart, type ColumnChunkModel } from './column-chunk-model';

/** A piece of a column as stored. */
export type ColumnChunk = Readonly<InferAttributes<ColumnChunkModel>>;

/** Reads and writes pieces of columns, each at most 256 KiB. */
export class ColumnChunkStore {
  private readonly chunks: ModelStatic<ColumnChunkModel>;

  constructor(private readonly sequelize: Sequelize) {
    this.chunks = defineColumnChunks(sequelize);
  }

  /** The bytes of all pieces of a column's part, in order. */
  async read(cutId: string, position: number, part: ChunkPart): Promise<readonly Buffer[]> {
    const found = await this.chunks.findAll({
      attributes: ['bytes'],
      where: { cutId, position, part },
      order: [['chunk', 'ASC']],
    });
    return found.map(({ bytes }) => bytes);
  }

  /** Adds some pieces by one statement; `bulkCreate` would write the bytes out as text. */
  async insertAll(chunks: readonly ColumnChunk[], unit: Unit): Promise<void> {
    if (chunks.length === 0) return;
    const rows = chunks.map((_, row) => `(${placeholders(row)})`).join(', ');
    const bind = chunks.flatMap(({ cutId, position, part, chunk, bytes }): unknown[] => [
      cutId,
      position,
      part,
      chunk,
      bytes,
    ]);
    await this.sequelize.query(`${INSERT} ${rows}`, {
      type: QueryTypes.INSERT,
      bind,
      ...within(unit),
    });
  }

  /** Removes some pieces of a cut; gives how many are left, so that each removal is small. */
  async removeSome(cutId: string, most: number, unit: Unit): Promise<number> {
    await this.sequelize.query(REMOVE_SOME, {
      type: QueryTypes.DELETE,
      replacements: { cutId, most },
      ...within(unit),
    });
    return this.chunks.count({ where: { cutId }, ...within(unit) });
  }
}

const INSERT = 'INSERT INTO column_chunks (cut_id, position, part, chunk, bytes) VALUES';
const COLUMNS = 5;

function placeholders(row: number): string {
  return Array.from({ length: COLUMNS }, (_, at) => `$${String(row * COLUMNS + at + 1)}`).join(
    ', ',
  );
}

const REMOVE_SOME = `DELETE FROM column_chunks WHERE cut_id = :cutId AND
  (position, part, chunk) IN (SELECT position, part, chunk FROM column_chunks
    WHERE cut_id = :cutId ORDER BY position, part, chunk LIMIT :most)`;
