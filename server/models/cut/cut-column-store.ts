import type { InferAttributes, ModelStatic, Sequelize } from 'sequelize';
import { plain, within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineCutColumns, type CutColumnModel } from './cut-column-model';

/** A column of a cut as stored. */
export type CutColumn = Readonly<InferAttributes<CutColumnModel>>;

/** The largest number of rows that SQLite takes in one statement. */
const ROWS_AT_ONCE = 500;

/** Reads and writes what is known of the columns of cuts; their contents lie in chunks. */
export class CutColumnStore {
  private readonly columns: ModelStatic<CutColumnModel>;

  constructor(sequelize: Sequelize) {
    this.columns = defineCutColumns(sequelize);
  }

  /** The columns of a cut, in the order of the file. */
  async list(cutId: string, unit?: Unit): Promise<readonly CutColumn[]> {
    const order: [string, string][] = [['position', 'ASC']];
    return (await this.columns.findAll({ where: { cutId }, order, ...within(unit) })).map(plain);
  }

  async insertAll(columns: readonly CutColumn[], unit: Unit): Promise<void> {
    for (let from = 0; from < columns.length; from += ROWS_AT_ONCE) {
      await this.columns.bulkCreate(columns.slice(from, from + ROWS_AT_ONCE), within(unit));
    }
  }

  /** Exchanges the columns of a loading cut, which get the ids that the code book gives them. */
  async replaceAll(cutId: string, columns: readonly CutColumn[], unit: Unit): Promise<void> {
    await this.columns.destroy({ where: { cutId }, ...within(unit) });
    await this.insertAll(columns, unit);
  }
}
