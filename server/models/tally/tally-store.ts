import type { ModelStatic, Sequelize } from 'sequelize';
import type { Tally } from '#shared/tally';
import { within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineTallies, type TallyModel } from './tally-model';

/** Counts as stored: what was counted is in the hash. */
export interface StoredTally {
  readonly hash: string;
  readonly cutId: string;
  readonly content: Tally;
  readonly createdAt: string;
}

/** Keeps counts, which never change. */
export class TallyStore {
  private readonly tallies: ModelStatic<TallyModel>;

  constructor(sequelize: Sequelize) {
    this.tallies = defineTallies(sequelize);
  }

  async find(hash: string): Promise<Tally | null> {
    const found = await this.tallies.findByPk(hash);
    return found === null ? null : (JSON.parse(found.content) as Tally);
  }

  /** Stores counts unless they are there already. */
  async insert(tally: StoredTally, unit: Unit): Promise<void> {
    const row = { ...tally, content: JSON.stringify(tally.content) };
    await this.tallies.bulkCreate([row], { ignoreDuplicates: true, ...within(unit) });
  }
}
