import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type ModelStatic,
  type Sequelize,
} from 'sequelize';
import { bytes, key } from '../columns';

/** What a chunk is a piece of: the codes of the rows, or the values they stand for. */
export type ChunkPart = 'codes' | 'dictionary';

/** At most 256 KiB of a column, which its position in the file names. */
export interface ColumnChunkModel extends Model<
  InferAttributes<ColumnChunkModel>,
  InferCreationAttributes<ColumnChunkModel>
> {
  cutId: string;
  position: number;
  part: ChunkPart;
  chunk: number;
  bytes: Buffer;
}

/** Binds the table of column chunks to a database. */
export function defineColumnChunks(sequelize: Sequelize): ModelStatic<ColumnChunkModel> {
  return sequelize.define<ColumnChunkModel>('column_chunks', {
    cutId: key(),
    position: key(DataTypes.INTEGER),
    part: key(),
    chunk: key(DataTypes.INTEGER),
    bytes: bytes(),
  });
}
