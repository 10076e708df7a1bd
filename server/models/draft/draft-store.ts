import type { InferAttributes, ModelStatic, Sequelize } from 'sequelize';
import { plain, within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineDrafts, type DraftModel } from './draft-model';

type Row = InferAttributes<DraftModel>;

/** A draft as stored. */
export type Draft = Readonly<Omit<Row, 'content'>> & { readonly content: unknown };

/** Reads and writes what people are typing. */
export class DraftStore {
  private readonly drafts: ModelStatic<DraftModel>;

  constructor(sequelize: Sequelize) {
    this.drafts = defineDrafts(sequelize);
  }

  /** A person's drafts in a report; nobody sees another's. */
  async of(reportId: string, personId: string): Promise<readonly Draft[]> {
    const rows = await this.drafts.findAll({ where: { reportId, personId } });
    return rows.map(plain).map((row) => ({ ...row, content: JSON.parse(row.content) as unknown }));
  }

  /** Keeps a draft in place of the person's earlier one of the same block. */
  async put(draft: Draft, unit: Unit): Promise<void> {
    await this.drafts.upsert({ ...draft, content: JSON.stringify(draft.content) }, within(unit));
  }

  async remove(reportId: string, blockId: string, personId: string, unit: Unit): Promise<void> {
    await this.drafts.destroy({ where: { reportId, blockId, personId }, ...within(unit) });
  }
}
