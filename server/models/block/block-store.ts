import type { InferAttributes, ModelStatic, Sequelize } from 'sequelize';
import type { Block } from '#shared/report';
import { plain, within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineBlocks, type BlockModel } from './block-model';

/** A block with the report that it belongs to. */
export type StoredBlock = Block & Pick<InferAttributes<BlockModel>, 'reportId'>;

/** Reads and writes the blocks of reports. */
export class BlockStore {
  private readonly blocks: ModelStatic<BlockModel>;

  constructor(sequelize: Sequelize) {
    this.blocks = defineBlocks(sequelize);
  }

  /** The blocks of these reports, removed ones included, in no particular order. */
  async of(reportIds: readonly string[], unit?: Unit): Promise<readonly StoredBlock[]> {
    const where = { reportId: [...reportIds] };
    return (await this.blocks.findAll({ where, ...within(unit) })).map(parse);
  }

  /** Inserts the block or replaces it. */
  async put(reportId: string, block: Block, unit: Unit): Promise<void> {
    const content = JSON.stringify(block.content);
    await this.blocks.upsert({ ...block, reportId, content }, within(unit));
  }
}

function parse(instance: BlockModel): StoredBlock {
  const row = plain(instance);
  return { ...row, content: JSON.parse(row.content) as unknown };
}
